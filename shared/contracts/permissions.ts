/** What a person may do in a studio, decided by the role of their membership. Read by the server on every route and by the client to offer only what is allowed. */

export const roles = ['owner', 'fitter', 'maker', 'wearer'] as const
export type Role = (typeof roles)[number]

export const permissions = [
  'studio.read', 'studio.manage', 'wearer.read', 'wearer.edit', 'pattern.read', 'pattern.edit',
  'project.list', 'project.create', 'project.read', 'project.edit', 'photograph.add', 'fitting.mark', 'change.decide',
  'comment.add', 'cut.agree', 'cut.clear',
] as const
export type Permission = (typeof permissions)[number]

const fitter = [
  'studio.read', 'wearer.read', 'pattern.read', 'project.list', 'project.read', 'photograph.add', 'fitting.mark',
  'change.decide', 'comment.add', 'cut.agree',
] as const satisfies readonly Permission[]

/** A wearer sees only what is made for them: the queries narrow lists and projects to their own. */
const wearer = ['wearer.read', 'project.list', 'project.read', 'comment.add'] as const satisfies readonly Permission[]

const granted: Record<Role, ReadonlySet<Permission>> = {
  owner: new Set(permissions),
  maker: new Set(permissions.filter((permission) => permission !== 'studio.manage')),
  fitter: new Set(fitter),
  wearer: new Set(wearer),
}

/** True when a member with this role may do this. */
export const may = (role: Role, permission: Permission): boolean => granted[role].has(permission)
