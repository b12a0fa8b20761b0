import { type Queryable } from '#db/client.ts'
import { auditQueries } from '#db/queries/auditEntries.ts'
import { sessionQueries } from '#db/queries/sessions.ts'
import { studioQueries } from '#db/queries/studios.ts'
import { wearerQueries } from '#db/queries/wearers.ts'
import { photographLimits } from '#shared/contracts/photograph.ts'
import { type Role } from '#shared/contracts/permissions.ts'
import { type Studio } from '#shared/contracts/studio.ts'
import { DomainError } from '#shared/errors.ts'

export type StudioService = ReturnType<typeof studioService>

export const studioService = ({ db }: { db: Queryable }) => ({
  /** A studio without members. @returns its id */
  async create(name: string): Promise<string> {
    return (await studioQueries(db).insert(name)).id
  },

  async read(studioId: string): Promise<Studio> {
    const row = await studioQueries(db).find(studioId)
    if (!row) throw new DomainError('not-found', 'There is no such studio.')
    const members = await studioQueries(db).members(studioId)
    const use = await studioQueries(db).photographUse(studioId)
    return {
      id: row.id, name: row.name,
      members: members.map((member) => ({ ...member, joinedAt: member.joinedAt.toISOString() })),
      photographs: { ...use, quotaBytes: photographLimits.quotaBytes },
    }
  },

  async rename(studioId: string, name: string): Promise<Studio> {
    await studioQueries(db).rename(studioId, name)
    return this.read(studioId)
  },

  /** Makes a person with an account a member, or gives a member another role. */
  async addMember(studioId: string, userId: string, role: Role): Promise<void> {
    await studioQueries(db).addMember({ studioId, userId, role })
    await sessionQueries(db).markForRotation(userId)
    await auditQueries(db).add('member.added', { userId, studioId }, { role })
  },

  /** @throws 'state.wrong' when the last owner would step down, 'not-found' when nobody with this id is a member */
  async changeRole(studioId: string, byUserId: string, userId: string, role: Role): Promise<Studio> {
    await db.transaction(async (tx) => {
      await requireOwnerBesides(tx, studioId, userId, role)
      await studioQueries(tx).setRole(studioId, userId, role)
      // New rights, new session id: one that leaked before must not gain them.
      await sessionQueries(tx).markForRotation(userId)
      await auditQueries(tx).add('member.role', { userId: byUserId, studioId }, { member: userId, role })
    })
    return this.read(studioId)
  },

  /** The member's work stays with the studio. @throws as `changeRole` does */
  async removeMember(studioId: string, byUserId: string, userId: string): Promise<Studio> {
    await db.transaction(async (tx) => {
      await requireOwnerBesides(tx, studioId, userId, null)
      await studioQueries(tx).removeMember(studioId, userId)
      await wearerQueries(tx).unlinkAccount(studioId, userId)
      await sessionQueries(tx).markForRotation(userId)
      await auditQueries(tx).add('member.removed', { userId: byUserId, studioId }, { member: userId })
    })
    return this.read(studioId)
  },
})

async function requireOwnerBesides(tx: Queryable, studioId: string, userId: string, nextRole: Role | null): Promise<void> {
  const members = await studioQueries(tx).lockMembers(studioId)
  if (!members.some((member) => member.userId === userId)) throw new DomainError('not-found', 'This person is not a member of the studio.')
  if (nextRole === 'owner' || members.some((member) => member.role === 'owner' && member.userId !== userId)) return
  throw new DomainError('state.wrong', 'A studio keeps at least one owner. Make someone else an owner first.')
}
