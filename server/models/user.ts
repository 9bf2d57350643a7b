import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import { required, tenantColumns, tenantOptions } from './tenant.ts';

/** A person of one school. Roles are memberships. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare username: string;
  declare email: CreationOptional<string | null>;
  declare name: string;
  declare sortName: string;
  declare passwordHash: CreationOptional<string | null>;
  declare disabledAt: CreationOptional<Date | null>;
}

User.init(
  {
    ...tenantColumns,
    username: required(DataTypes.TEXT),
    email: { type: DataTypes.TEXT, allowNull: true },
    name: required(DataTypes.TEXT),
    sortName: required(DataTypes.TEXT),
    passwordHash: { type: DataTypes.TEXT, allowNull: true },
    disabledAt: { type: DataTypes.DATE, allowNull: true },
  },
  tenantOptions('User', 'users'),
);
