import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** When a class was taught a topic. */
export class TopicTeaching extends Model<InferAttributes<TopicTeaching>, InferCreationAttributes<TopicTeaching>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare classId: string;
  declare topicId: string;
  declare taughtOn: string;
}

TopicTeaching.init(
  {
    ...tenantColumns,
    classId: reference(),
    topicId: reference(),
    taughtOn: required(DataTypes.DATEONLY),
  },
  tenantOptions('TopicTeaching', 'topic_teachings'),
);
