import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import type { Role } from '#shared/schemas/role.ts';
import { optionalReference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** A line of the append-only audit log. */
export class AuditEntry extends Model<InferAttributes<AuditEntry>, InferCreationAttributes<AuditEntry>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare at: Date;
  declare actorId: CreationOptional<string | null>;
  declare actingRole: CreationOptional<Role | null>;
  declare action: string;
  declare objectType: string;
  declare objectId: CreationOptional<string | null>;
  declare fields: string[];
  declare outcome: 'done' | 'refused';
  declare requestId: CreationOptional<string | null>;
}

AuditEntry.init(
  {
    ...tenantColumns,
    at: required(DataTypes.DATE),
    actorId: optionalReference(),
    actingRole: { type: DataTypes.TEXT, allowNull: true },
    action: required(DataTypes.TEXT),
    objectType: required(DataTypes.TEXT),
    objectId: optionalReference(),
    fields: required(DataTypes.ARRAY(DataTypes.TEXT)),
    outcome: required(DataTypes.TEXT),
    requestId: { type: DataTypes.TEXT, allowNull: true },
  },
  tenantOptions('AuditEntry', 'audit'),
);
