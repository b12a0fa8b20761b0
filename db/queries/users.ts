import { eq } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { memberships, studios } from '#db/schema/studios.ts'
import { type UserRow, users } from '#db/schema/users.ts'

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
  /** Oldest first, so that a person's own studio leads. */
  async membershipsOf(userId: string) {
    return db.select({ studioId: memberships.studioId, studioName: studios.name, role: memberships.role })
      .from(memberships).innerJoin(studios, eq(studios.id, memberships.studioId))
      .where(eq(memberships.userId, userId)).orderBy(memberships.createdAt, memberships.studioId)
  },
})
