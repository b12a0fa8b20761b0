import { z } from 'zod'
import { id, isoDateTime, line, units } from './common.ts'
import { roles } from './permissions.ts'
import { defineRoute } from './route.ts'

export const email = z.string().trim().toLowerCase().max(254).pipe(z.email('Type the whole address, like name@example.org.'))
/** Length only, no composition rules (NIST SP 800-63B); common words are refused by the server. */
export const newPassword = z.string().normalize('NFC').min(12, 'Use at least 12 characters.').max(128, 'Use at most 128 characters.')

export const membership = z.object({ studioId: id, studioName: z.string(), role: z.enum(roles) })
export const me = z.object({ id, name: z.string(), email: z.string(), units, memberships: z.array(membership) })
export type Me = z.infer<typeof me>

export const signUp = defineRoute({
  id: 'account.sign-up', method: 'post', path: '/api/sign-up', access: 'public', status: 201,
  summary: 'Make an account and a studio of one, and sign in',
  body: z.strictObject({ name: line(80), email, password: newPassword, studioName: line(80).optional(), units: units.default('cm') }),
  response: me,
})
export const signIn = defineRoute({
  id: 'account.sign-in', method: 'post', path: '/api/sign-in', access: 'public',
  summary: 'Sign in with e-mail and password',
  body: z.strictObject({ email, password: z.string().min(1).max(128) }),
  response: me,
})
export const signOut = defineRoute({
  id: 'account.sign-out', method: 'post', path: '/api/sign-out', access: 'public', status: 204,
  summary: 'End this session', response: null,
})
export const readMe = defineRoute({
  id: 'account.me', method: 'get', path: '/api/me', access: 'signed-in', summary: 'The person who is signed in', response: me,
})
export const updateMe = defineRoute({
  id: 'account.update', method: 'patch', path: '/api/me', access: 'signed-in', summary: 'Change name or units',
  body: z.strictObject({ name: line(80).optional(), units: units.optional() }), response: me,
})
export const changePassword = defineRoute({
  id: 'account.password', method: 'put', path: '/api/me/password', access: 'signed-in', status: 204,
  summary: 'Change the password; every other session ends',
  body: z.strictObject({ current: z.string().min(1).max(128), next: newPassword }), response: null,
})
export const sessionEntry = z.object({ id: z.string(), current: z.boolean(), startedAt: isoDateTime, lastSeenAt: isoDateTime, device: z.string() })
export const listSessions = defineRoute({
  id: 'account.sessions', method: 'get', path: '/api/me/sessions', access: 'signed-in', summary: 'Where this account is signed in',
  response: z.object({ sessions: z.array(sessionEntry) }),
})
export const endSession = defineRoute({
  id: 'account.end-session', method: 'delete', path: '/api/me/sessions/:sessionId', access: 'signed-in', status: 204,
  summary: 'Sign out somewhere else', params: z.strictObject({ sessionId: z.string().min(16).max(128) }), response: null,
})
export const requestReset = defineRoute({
  id: 'account.request-reset', method: 'post', path: '/api/password-resets', access: 'public', status: 204,
  summary: 'Send a link to set a new password; the answer is the same for an unknown address',
  body: z.strictObject({ email }), response: null,
})
export const resetPassword = defineRoute({
  id: 'account.reset', method: 'post', path: '/api/password-resets/use', access: 'public', status: 204,
  summary: 'Set a new password with the link that was sent',
  body: z.strictObject({ token: z.string().min(20).max(200), password: newPassword }), response: null,
})
