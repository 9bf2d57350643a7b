import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import type { Tier } from '#shared/schemas/common.ts';
import type { DraftBody, VersionStatus } from '#shared/schemas/question.ts';
import type { QuestionKind } from '#shared/schemas/question-body.ts';
import { optionalReference, reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** One wording of a question with its mark scheme. Past draft it is never reworded. */
export class QuestionVersion extends Model<InferAttributes<QuestionVersion>, InferCreationAttributes<QuestionVersion>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare questionId: string;
  declare version: number;
  declare status: VersionStatus;
  declare revision: number;
  declare kind: QuestionKind;
  declare tier: CreationOptional<Tier | null>;
  declare option: CreationOptional<string | null>;
  declare body: DraftBody;
  declare searchText: string;
  declare excerpt: string;
  declare maxMarks: number;
  declare expectedSeconds: number;
  declare authorId: string;
  declare lastEditedBy: string;
  declare reviewerId: CreationOptional<string | null>;
  declare reviewComment: CreationOptional<string | null>;
  declare savedAt: Date;
  declare sentAt: CreationOptional<Date | null>;
  declare liveAt: CreationOptional<Date | null>;
}

QuestionVersion.init(
  {
    ...tenantColumns,
    questionId: reference(),
    version: required(DataTypes.INTEGER),
    status: required(DataTypes.TEXT),
    revision: required(DataTypes.INTEGER),
    kind: required(DataTypes.TEXT),
    tier: { type: DataTypes.TEXT, allowNull: true },
    option: { type: DataTypes.TEXT, allowNull: true },
    body: required(DataTypes.JSONB),
    searchText: required(DataTypes.TEXT),
    excerpt: required(DataTypes.TEXT),
    maxMarks: required(DataTypes.INTEGER),
    expectedSeconds: required(DataTypes.INTEGER),
    authorId: reference(),
    lastEditedBy: reference(),
    reviewerId: optionalReference(),
    reviewComment: { type: DataTypes.TEXT, allowNull: true },
    savedAt: required(DataTypes.DATE),
    sentAt: { type: DataTypes.DATE, allowNull: true },
    liveAt: { type: DataTypes.DATE, allowNull: true },
  },
  tenantOptions('QuestionVersion', 'question_versions'),
);
