import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import type { Role } from '#shared/schemas/role.ts';
import { optionalReference, reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** A role a person holds from a day to a day. */
export class Membership extends Model<InferAttributes<Membership>, InferCreationAttributes<Membership>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare userId: string;
  declare role: Role;
  declare subjectId: CreationOptional<string | null>;
  declare yearGroupId: CreationOptional<string | null>;
  declare tutorGroupId: CreationOptional<string | null>;
  declare validFrom: string;
  declare validTo: CreationOptional<string | null>;
}

Membership.init(
  {
    ...tenantColumns,
    userId: reference(),
    role: required(DataTypes.TEXT),
    subjectId: optionalReference(),
    yearGroupId: optionalReference(),
    tutorGroupId: optionalReference(),
    validFrom: required(DataTypes.DATEONLY),
    validTo: { type: DataTypes.DATEONLY, allowNull: true },
  },
  tenantOptions('Membership', 'memberships'),
);
