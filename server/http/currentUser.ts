import { type Request } from 'express'
import { type SignedIn } from '../access/checkAccess.ts'

declare module 'express-session' {
  interface SessionData {
    userId: string
    /** milliseconds since 1970 */
    startedAt: number
    lastSeenAt: number
    /** browser and system in a few words, for the list of sessions */
    device: string
    /** set when the person's rights changed: the next request gets a new session id */
    rotate: boolean
  }
}

/** The person this request's session belongs to, or null. */
export const currentUser = (req: Request): SignedIn | null => (req.session?.userId ? { id: req.session.userId } : null)
