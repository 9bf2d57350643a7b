import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { optionalReference, reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** One thing to answer; its wording is in its versions. */
export class Question extends Model<InferAttributes<Question>, InferCreationAttributes<Question>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare subjectId: string;
  declare number: number;
  declare authorId: string;
  declare liveVersionId: CreationOptional<string | null>;
  declare retiredAt: CreationOptional<Date | null>;
}

Question.init(
  {
    ...tenantColumns,
    subjectId: reference(),
    number: required(DataTypes.INTEGER),
    authorId: reference(),
    liveVersionId: optionalReference(),
    retiredAt: { type: DataTypes.DATE, allowNull: true },
  },
  tenantOptions('Question', 'questions'),
);
