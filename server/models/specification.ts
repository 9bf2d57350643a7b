import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** A board's content list for a subject. */
export class Specification extends Model<InferAttributes<Specification>, InferCreationAttributes<Specification>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare subjectId: string;
  declare name: string;
}

Specification.init(
  {
    ...tenantColumns,
    subjectId: reference(),
    name: required(DataTypes.TEXT),
  },
  tenantOptions('Specification', 'specifications'),
);
