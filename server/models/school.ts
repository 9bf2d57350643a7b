import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { required, tenantOptions } from './tenant.ts';

/** The tenant. Its key is the school's id itself. */
export class School extends Model<InferAttributes<School>, InferCreationAttributes<School>> {
  declare schoolId: string;
  declare name: string;
  declare code: string;
  /** IANA time zone: "Europe/London". */
  declare zone: string;
  declare isDemo: CreationOptional<boolean>;
  /** Most subjects in one set, 2–8. */
  declare subjectsPerSet: CreationOptional<number>;
  /** The last day of the exam season, where no sitting is known. */
  declare seasonEndsOn: string;
}

School.init(
  {
    schoolId: { type: DataTypes.UUID, primaryKey: true },
    name: required(DataTypes.TEXT),
    code: required(DataTypes.TEXT),
    zone: required(DataTypes.TEXT),
    isDemo: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    subjectsPerSet: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 4 },
    seasonEndsOn: required(DataTypes.DATEONLY),
  },
  tenantOptions('School', 'schools'),
);
