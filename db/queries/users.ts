import { eq, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { prepared } from '#db/prepared.ts'
import { memberships, studios } from '#db/schema/studios.ts'
import { type UserRow, users } from '#db/schema/users.ts'

const withMemberships = prepared((db) => db.select({
  id: users.id, name: users.name, email: users.email, units: users.units,
  membership: { studioId: studios.id, studioName: studios.name, role: memberships.role },
}).from(users).leftJoin(memberships, eq(memberships.userId, users.id)).leftJoin(studios, eq(studios.id, memberships.studioId))
  .where(eq(users.id, sql.placeholder('userId'))).orderBy(memberships.createdAt, memberships.studioId)
  .prepare('user_with_memberships'))

export const userQueries = (db: Queryable) => ({
  async find(id: string): Promise<UserRow | null> {
    const [row] = await db.select().from(users).where(eq(users.id, id))
    return row ?? null
  },
  async findByEmail(email: string): Promise<UserRow | null> {
    const [row] = await db.select().from(users).where(eq(users.email, email))
    return row ?? null
  },
  /** Null when the address is taken. */
  async insert(user: typeof users.$inferInsert): Promise<UserRow | null> {
    const [row] = await db.insert(users).values(user).onConflictDoNothing({ target: users.email }).returning()
    return row ?? null
  },
  async update(id: string, set: Partial<Pick<UserRow, 'name' | 'units' | 'passwordHash'>>): Promise<void> {
    if (Object.keys(set).length > 0) await db.update(users).set(set).where(eq(users.id, id))
  },
  /** The account with its memberships, oldest first so that a person's own studio leads; one row per membership, none of it null only without any. */
  async withMemberships(userId: string) {
    return withMemberships(db).execute({ userId })
  },
})
