import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { required, tenantColumns, tenantOptions } from './tenant.ts';

/** A subject as the school teaches it; `strand` is its colour label. */
export class Subject extends Model<InferAttributes<Subject>, InferCreationAttributes<Subject>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare code: string;
  declare name: string;
  declare strand: string;
  declare position: number;
}

Subject.init(
  {
    ...tenantColumns,
    code: required(DataTypes.TEXT),
    name: required(DataTypes.TEXT),
    strand: required(DataTypes.TEXT),
    position: required(DataTypes.INTEGER),
  },
  tenantOptions('Subject', 'subjects'),
);
