import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import type { Reason } from '#shared/schemas/reason.ts';
import { reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** One question of a set, in its place, with why it was chosen. */
export class SetItem extends Model<InferAttributes<SetItem>, InferCreationAttributes<SetItem>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare setId: string;
  declare position: number;
  declare questionId: string;
  declare questionVersionId: string;
  declare subjectId: string;
  declare topicId: string;
  declare reason: Reason;
  /** What was believed of a question never attempted: recall 0–1, and days since its topic was taught. */
  declare priorRecall: CreationOptional<number | null>;
  declare priorDays: CreationOptional<number | null>;
}

SetItem.init(
  {
    ...tenantColumns,
    setId: reference(),
    position: required(DataTypes.INTEGER),
    questionId: reference(),
    questionVersionId: reference(),
    subjectId: reference(),
    topicId: reference(),
    reason: required(DataTypes.JSONB),
    priorRecall: { type: DataTypes.DOUBLE, allowNull: true },
    priorDays: { type: DataTypes.INTEGER, allowNull: true },
  },
  tenantOptions('SetItem', 'set_items'),
);
