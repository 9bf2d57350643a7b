import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** That a version of a question serves a topic; one per specification. */
export class QuestionTopic extends Model<InferAttributes<QuestionTopic>, InferCreationAttributes<QuestionTopic>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare questionId: string;
  declare questionVersionId: string;
  declare topicId: string;
  declare position: number;
}

QuestionTopic.init(
  {
    ...tenantColumns,
    questionId: reference(),
    questionVersionId: reference(),
    topicId: reference(),
    position: required(DataTypes.INTEGER),
  },
  tenantOptions('QuestionTopic', 'question_topics'),
);
