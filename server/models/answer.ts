import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import { reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** One handed-in answer. Rows are added and never changed. */
export class Answer extends Model<InferAttributes<Answer>, InferCreationAttributes<Answer>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare setItemId: string;
  declare userId: string;
  declare questionId: string;
  declare questionVersionId: string;
  declare topicId: string;
  declare responses: string[];
  declare howSure: HowSure;
  declare seconds: number;
  declare givenAt: Date;
  declare givenOn: string;
  declare receivedAt: Date;
  declare isLate: boolean;
}

Answer.init(
  {
    ...tenantColumns,
    setItemId: reference(),
    userId: reference(),
    questionId: reference(),
    questionVersionId: reference(),
    topicId: reference(),
    responses: required(DataTypes.JSONB),
    howSure: required(DataTypes.TEXT),
    seconds: required(DataTypes.INTEGER),
    givenAt: required(DataTypes.DATE),
    givenOn: required(DataTypes.DATEONLY),
    receivedAt: required(DataTypes.DATE),
    isLate: required(DataTypes.BOOLEAN),
  },
  tenantOptions('Answer', 'answers'),
);
