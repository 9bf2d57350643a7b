import { DataTypes, type InitOptions, type Model, type ModelAttributeColumnOptions } from 'sequelize';
import { scopeNow } from '#server/db/scope.ts';
import { sequelize } from '#server/db/sequelize.ts';

/** A required reference to a row of another table. */
export const reference = (): ModelAttributeColumnOptions => ({ type: DataTypes.UUID, allowNull: false });
/** A reference that may be missing. */
export const optionalReference = (): ModelAttributeColumnOptions => ({ type: DataTypes.UUID, allowNull: true });
export const required = (type: ModelAttributeColumnOptions['type']): ModelAttributeColumnOptions => ({
  type,
  allowNull: false,
});

/** Columns of every tenant table. The table's key is (school_id, id); the wall supplies the school. */
export const tenantColumns = {
  id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
  schoolId: { type: DataTypes.UUID, allowNull: false },
} as const;

const nameSchool = (row: Model) => {
  if (!row.get('schoolId')) row.set('schoolId', scopeNow().schoolId);
};
const needScope = () => void scopeNow();

/** Options of a tenant model: its rows belong to the school of the open scope, and outside one it throws. */
export const tenantOptions = <M extends Model>(modelName: string, tableName: string): InitOptions<M> => ({
  sequelize,
  modelName,
  tableName,
  hooks: {
    beforeValidate: nameSchool,
    beforeBulkCreate: (rows) => {
      for (const row of rows) nameSchool(row);
    },
    beforeFind: needScope,
    beforeCount: needScope,
    beforeBulkUpdate: needScope,
    beforeBulkDestroy: needScope,
  },
});
