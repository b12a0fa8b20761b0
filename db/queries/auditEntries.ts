import { type Queryable } from '#db/client.ts'
import { auditEntries } from '#db/schema/auditEntries.ts'

export type AuditEvent =
  | 'sign-up' | 'sign-in' | 'sign-in.failed' | 'sign-out' | 'session.ended' | 'password.changed' | 'password.reset-requested' | 'password.reset'
  | 'member.added' | 'member.role' | 'member.removed' | 'wearer.removed' | 'measurements.removed' | 'pattern.removed'
  | 'project.removed' | 'project.cleared' | 'photograph.removed' | 'export'

export const auditQueries = (db: Queryable) => ({
  /** @param details - ids and words of our own; never an address, a name or what was typed */
  async add(event: AuditEvent, who: { userId: string | null; studioId?: string }, details: Record<string, string> = {}): Promise<void> {
    await db.insert(auditEntries).values({ event, userId: who.userId, studioId: who.studioId ?? null, details })
  },
})
