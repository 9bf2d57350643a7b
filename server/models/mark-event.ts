import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize';
import type { MarkedPart } from '#shared/schemas/marked-part.ts';
import { optionalReference, reference, required, tenantColumns, tenantOptions } from './tenant.ts';

/** A mark given to an answer. Marking again adds an event; the newest counts. */
export class MarkEvent extends Model<InferAttributes<MarkEvent>, InferCreationAttributes<MarkEvent>> {
  declare id: CreationOptional<string>;
  declare schoolId: CreationOptional<string>;
  declare answerId: string;
  declare sequence: number;
  declare source: 'plait' | 'student' | 'teacher';
  declare markedBy: CreationOptional<string | null>;
  declare parts: MarkedPart[];
  declare marks: number;
  declare maxMarks: number;
  declare markedAt: Date;
}

MarkEvent.init(
  {
    ...tenantColumns,
    answerId: reference(),
    sequence: required(DataTypes.INTEGER),
    source: required(DataTypes.TEXT),
    markedBy: optionalReference(),
    parts: required(DataTypes.JSONB),
    marks: required(DataTypes.INTEGER),
    maxMarks: required(DataTypes.INTEGER),
    markedAt: required(DataTypes.DATE),
  },
  tenantOptions('MarkEvent', 'mark_events'),
);
