import type { EntityManager } from 'typeorm';
import type { Actor } from './actor.ts';

interface AuditEntry {
  action: string;
  objectKind: string;
  objectId: string;
  reason?: string;
}

/** Writes who did what to the append-only audit log, inside the transaction that does it. No secrets, no amounts of bids. */
export async function audit(
  tx: EntityManager,
  actor: Actor | null,
  { action, objectKind, objectId, reason = '' }: AuditEntry,
): Promise<void> {
  await tx.query(
    `insert into audit_log (actor_id, session_id, ip, action, object_kind, object_id, reason, request_id) values ($1, $2, $3, $4, $5, $6, $7, $8)`,
    [
      actor?.id ?? null,
      actor?.sessionId ?? null,
      actor?.ip ?? null,
      action,
      objectKind,
      objectId,
      reason,
      actor?.requestId ?? null,
    ],
  );
}
