import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import type { Tier } from '#shared/schemas/common.ts';
import { optionalReference, reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** A numbered part of a specification that can be revised in a few sessions. */
export class Topic extends Model<InferAttributes<Topic>, InferCreationAttributes<Topic>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare specificationId: string;
  declare parentId: CreationOptional<string | null>;
  declare number: string;
  declare title: string;
  declare tier: CreationOptional<Tier | null>;
  declare option: CreationOptional<string | null>;
  declare position: number;
  /** The topic that it was merged into, never itself a merged one; null while it is one of the specification's. */
  declare mergedIntoId: CreationOptional<string | null>;
}

Topic.init(
  {
    ...tenantColumns,
    specificationId: reference(),
    parentId: optionalReference(),
    number: required(DataTypes.TEXT),
    title: required(DataTypes.TEXT),
    tier: { type: DataTypes.TEXT, allowNull: true },
    option: { type: DataTypes.TEXT, allowNull: true },
    position: required(DataTypes.INTEGER),
    mergedIntoId: optionalReference(),
  },
  tenantOptions('Topic', 'topics'),
);
