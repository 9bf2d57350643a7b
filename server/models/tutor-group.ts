import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** A form, with its tutor: "11K". */
export class TutorGroup extends Model<InferAttributes<TutorGroup>, InferCreationAttributes<TutorGroup>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare yearGroupId: string;
  declare name: string;
}

TutorGroup.init(
  {
    ...tenantColumns,
    yearGroupId: reference(),
    name: required(DataTypes.TEXT),
  },
  tenantOptions('TutorGroup', 'tutor_groups'),
);
