import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import type { SetKind } from '#shared/schemas/set-kind.ts';
import { reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** A session's questions for one student. */
export class PracticeSet extends Model<InferAttributes<PracticeSet>, InferCreationAttributes<PracticeSet>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare userId: string;
  declare kind: SetKind;
  /** Topics the student chose, in order of id; none in a mixed or morning set. */
  declare topicIds: CreationOptional<string[]>;
  declare setOn: string;
  declare budgetSeconds: number;
  declare openedAt: Date;
  declare finishedAt: CreationOptional<Date | null>;
}

PracticeSet.init(
  {
    ...tenantColumns,
    userId: reference(),
    kind: required(DataTypes.TEXT),
    topicIds: { type: DataTypes.ARRAY(DataTypes.UUID), allowNull: false, defaultValue: [] },
    setOn: required(DataTypes.DATEONLY),
    budgetSeconds: required(DataTypes.INTEGER),
    openedAt: required(DataTypes.DATE),
    finishedAt: { type: DataTypes.DATE, allowNull: true },
  },
  tenantOptions('PracticeSet', 'sets'),
);
