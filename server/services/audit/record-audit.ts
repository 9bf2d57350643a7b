import { scopeNow } from '#server/db/scope.ts';
import { AuditEntry } from '#server/models/audit-entry.ts';
import type { Role } from '#shared/schemas/role.ts';

/** Who acted; the role is the first that the person holds where several apply. */
export interface AuditActor {
  userId: string;
  memberships?: { role: Role }[];
}

/**
 * Adds a line to the audit log, in the transaction of what it tells. Ids and names of fields only: never a name, an
 * answer or an old value. @param fields names of the changed columns
 */
export async function recordAudit(
  actor: AuditActor | null,
  action: string,
  objectType: string,
  objectId: string | null,
  outcome: 'done' | 'refused',
  fields: string[] = [],
): Promise<void> {
  await AuditEntry.create({
    at: scopeNow().now,
    actorId: actor?.userId ?? null,
    actingRole: actor?.memberships?.[0]?.role ?? null,
    action,
    objectType,
    objectId,
    fields,
    outcome,
    requestId: scopeNow().requestId ?? null,
  });
}
