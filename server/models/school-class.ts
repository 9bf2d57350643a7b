import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** A teaching group in one subject. */
export class SchoolClass extends Model<InferAttributes<SchoolClass>, InferCreationAttributes<SchoolClass>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare subjectId: string;
  declare specificationId: string;
  declare yearGroupId: string;
  declare name: string;
}

SchoolClass.init(
  {
    ...tenantColumns,
    subjectId: reference(),
    specificationId: reference(),
    yearGroupId: reference(),
    name: required(DataTypes.TEXT),
  },
  tenantOptions('SchoolClass', 'classes'),
);
