import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { required, tenantColumns, tenantOptions } from './tenant.ts';

/** A cohort: "Year 11". */
export class YearGroup extends Model<InferAttributes<YearGroup>, InferCreationAttributes<YearGroup>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare name: string;
}

YearGroup.init(
  {
    ...tenantColumns,
    name: required(DataTypes.TEXT),
  },
  tenantOptions('YearGroup', 'year_groups'),
);
