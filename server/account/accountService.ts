import { createHash, randomBytes } from 'node:crypto'
import { type z } from 'zod'
import { type Queryable } from '#db/client.ts'
import { auditQueries } from '#db/queries/auditEntries.ts'
import { passwordResetQueries } from '#db/queries/passwordResets.ts'
import { sessionQueries } from '#db/queries/sessions.ts'
import { studioQueries } from '#db/queries/studios.ts'
import { userQueries } from '#db/queries/users.ts'
import { wearerQueries } from '#db/queries/wearers.ts'
import { type Me, type sessionEntry, type signUp, type updateMe } from '#shared/contracts/account.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { checkPassword } from './checkPassword.ts'
import { hashPassword, isOutdated, verifyPassword } from './passwords.ts'
import { type ResetMail } from './resetMail.ts'

const resetValidMs = 60 * 60 * 1000
const digestOf = (token: string) => createHash('sha256').update(token).digest('hex')

export type AccountService = ReturnType<typeof accountService>

export const accountService = ({ db, sendResetMail }: { db: Queryable; sendResetMail: ResetMail }) => ({
  /** Makes an account, a studio of one with every right, and the person as its first wearer. @throws 'sign-up.taken', 'password.weak' */
  async signUp(input: RouteBody<typeof signUp>): Promise<string> {
    checkPassword(input.password, [input.name, input.email, input.studioName ?? ''])
    const passwordHash = await hashPassword(input.password)
    return db.transaction(async (tx) => {
      const user = await userQueries(tx).insert({ email: input.email, name: input.name, units: input.units, passwordHash })
      if (!user) throw new DomainError('sign-up.taken', 'There is an account with this address. Sign in, or ask for a new password.', { email: 'There is an account with this address.' })
      const studio = await studioQueries(tx).insert(input.studioName ?? `${input.name}: sewing`.slice(0, 80))
      await studioQueries(tx).addMember({ studioId: studio.id, userId: user.id, role: 'owner' })
      // Most people who start alone sew for themselves.
      await wearerQueries(tx).insert({ studioId: studio.id, userId: user.id, name: input.name })
      await auditQueries(tx).add('sign-up', { userId: user.id, studioId: studio.id })
      return user.id
    })
  },

  /** @returns the account's id. @throws 'sign-in.wrong' with one answer and one amount of work for an unknown address and a wrong password */
  async signIn(email: string, password: string): Promise<string> {
    const user = await userQueries(db).findByEmail(email)
    const matches = await verifyPassword(user?.passwordHash ?? null, password)
    if (!user || !matches) {
      await auditQueries(db).add('sign-in.failed', { userId: user?.id ?? null })
      throw new DomainError('sign-in.wrong', 'Address and password do not belong together. Check both, or ask for a new password.')
    }
    if (isOutdated(user.passwordHash)) await userQueries(db).update(user.id, { passwordHash: await hashPassword(password) })
    await auditQueries(db).add('sign-in', { userId: user.id })
    return user.id
  },

  async signedOut(userId: string): Promise<void> {
    await auditQueries(db).add('sign-out', { userId })
  },

  async me(userId: string): Promise<Me> {
    const rows = await userQueries(db).withMemberships(userId)
    const [user] = rows
    if (!user) throw new DomainError('sign-in.needed', 'This account is gone. Sign in with another one.')
    const memberships = rows.flatMap(({ membership }) => (isMembership(membership) ? [membership] : []))
    return { id: user.id, name: user.name, email: user.email, units: user.units, memberships }
  },

  async update(userId: string, set: RouteBody<typeof updateMe>): Promise<Me> {
    await userQueries(db).update(userId, set)
    return this.me(userId)
  },

  /** Changes the password and ends every session of the account; the caller starts a new one for the person who did it. */
  async changePassword(userId: string, current: string, next: string): Promise<void> {
    const user = await userQueries(db).find(userId)
    if (!(await verifyPassword(user?.passwordHash ?? null, current)) || !user) {
      throw new DomainError('sign-in.wrong', 'The current password is not right, so nothing was changed.', { current: 'This is not your current password.' })
    }
    await this.setPassword(user, next, 'password.changed')
  },

  /** @internal shared by change and reset */
  async setPassword(user: { id: string; name: string; email: string }, password: string, event: 'password.changed' | 'password.reset', on: Queryable = db): Promise<void> {
    checkPassword(password, [user.name, user.email])
    const passwordHash = await hashPassword(password)
    await on.transaction(async (tx) => {
      await userQueries(tx).update(user.id, { passwordHash })
      await passwordResetQueries(tx).removeOf(user.id)
      await sessionQueries(tx).endAll(user.id)
      await auditQueries(tx).add(event, { userId: user.id })
    })
  },

  /** Sends a link when there is such an account; nothing the caller sees tells whether there is. */
  async requestReset(email: string): Promise<void> {
    const token = randomBytes(32).toString('base64url')
    const found = await passwordResetQueries(db).insertFor(email, digestOf(token), resetValidMs)
    await auditQueries(db).add('password.reset-requested', { userId: found?.userId ?? null })
    if (found) sendResetMail(email, token)
  },

  /** Uses a link once. @throws 'token.invalid'; 'password.weak' leaves the link good for another try */
  async resetPassword(token: string, password: string): Promise<void> {
    await db.transaction(async (tx) => {
      const userId = await passwordResetQueries(tx).use(digestOf(token))
      const user = userId ? await userQueries(tx).find(userId) : null
      if (!user) throw new DomainError('token.invalid', 'This link was used before or is older than an hour. Ask for a new one.')
      await this.setPassword(user, password, 'password.reset', tx)
    })
  },

  /** Most recently used first. @param currentSid - the id of the session that asks */
  async sessions(userId: string, currentSid: string): Promise<z.infer<typeof sessionEntry>[]> {
    const rows = await sessionQueries(db).ofUser(userId)
    return rows.sort((a, b) => b.sess.lastSeenAt - a.sess.lastSeenAt).map(({ sid, publicId, sess }) => ({
      id: publicId, current: sid === currentSid, device: sess.device,
      startedAt: new Date(sess.startedAt).toISOString(), lastSeenAt: new Date(sess.lastSeenAt).toISOString(),
    }))
  },

  async endSession(userId: string, sessionId: string): Promise<void> {
    if ((await sessionQueries(db).endOne(userId, sessionId)) === 0) throw new DomainError('not-found', 'This session has ended already.')
    await auditQueries(db).add('session.ended', { userId })
  },
})

type Joined = { [Field in keyof Me['memberships'][number]]: Me['memberships'][number][Field] | null }
/** A left join answers nulls for a person who is a member nowhere. */
const isMembership = (joined: Joined): joined is Me['memberships'][number] => joined.studioId !== null
