import { type Knex } from 'knex';

/** Who did what to what. Append-only. */
export interface AuditEvent {
  readonly crewId: string | null;
  readonly userId: string;
  readonly action: string;
  readonly subjectId: string | null;
  readonly detail: Readonly<Record<string, unknown>>;
}

export async function recordAudit(db: Knex, event: AuditEvent): Promise<void> {
  await db('audit_events').insert({
    crew_id: event.crewId,
    user_id: event.userId,
    action: event.action,
    subject_id: event.subjectId,
    detail: JSON.stringify(event.detail),
  });
}
