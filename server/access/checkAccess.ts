import { z } from 'zod'
import { accessQueries } from '#db/queries/access.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type MembershipRow } from '#db/schema/studios.ts'
import { type Queryable } from '#db/client.ts'
import { type Permission, may } from '#shared/contracts/permissions.ts'
import { type Access } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'

export type SignedIn = { id: string }
export type Granted = { user: SignedIn | null; membership: MembershipRow | null; project: ProjectRow | null }

const isId = (value: unknown): value is string => z.uuid().safeParse(value).success
// Someone else's and none look the same from outside, on purpose; so does an address that cannot exist.
const unseen = () => new DomainError('not-found', 'There is nothing here that you can see. Check the address, or ask the studio’s owner for access.')

/**
 * Decides whether this person may call a route: the one place where that is decided.
 * @param params - the path's parameters as they came; `studioId` or `projectId` is read from them
 * @throws DomainError 'sign-in.needed' when nobody is signed in, 'not-found' for what the person cannot see,
 *   'not-allowed' for what they see but whose role does not reach
 */
export async function checkAccess(db: Queryable, access: Access, user: SignedIn | null, params: Readonly<Record<string, unknown>>): Promise<Granted> {
  if (access === 'public') return { user, membership: null, project: null }
  if (!user) throw new DomainError('sign-in.needed', 'Sign in to go on.')
  if (access === 'signed-in') return { user, membership: null, project: null }

  if ('studio' in access) {
    const membership = isId(params.studioId) ? await accessQueries(db).membershipOf(user.id, params.studioId) : null
    if (!membership) throw unseen()
    requirePermission(membership, access.studio)
    return { user, membership, project: null }
  }
  const seen = isId(params.projectId) ? await accessQueries(db).projectSeenBy(user.id, params.projectId) : null
  if (!seen) throw unseen()
  requirePermission(seen.membership, access.project)
  return { user, ...seen }
}

function requirePermission(membership: MembershipRow, permission: Permission): void {
  if (may(membership.role, permission)) return
  throw new DomainError('not-allowed', `As a ${membership.role} in this studio you cannot do this. Ask an owner to do it, or to change your role.`, { permission })
}
