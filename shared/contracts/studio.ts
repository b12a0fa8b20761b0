import { z } from 'zod'
import { id, isoDateTime, line, studioParams } from './common.ts'
import { roles } from './permissions.ts'
import { defineRoute } from './route.ts'

export const member = z.object({ userId: id, name: z.string(), email: z.string(), role: z.enum(roles), joinedAt: isoDateTime })
export const studio = z.object({
  id, name: z.string(), members: z.array(member),
  photographs: z.object({ count: z.int(), bytes: z.number(), quotaBytes: z.number() }),
})
export type Studio = z.infer<typeof studio>
const memberParams = studioParams.extend({ userId: id })

export const readStudio = defineRoute({
  id: 'studios.read', method: 'get', path: '/api/studios/:studioId', access: { studio: 'studio.read' },
  summary: 'A studio with its members', params: studioParams, response: studio,
})
export const renameStudio = defineRoute({
  id: 'studios.rename', method: 'patch', path: '/api/studios/:studioId', access: { studio: 'studio.manage' },
  summary: 'Rename the studio', params: studioParams, body: z.strictObject({ name: line(80) }), response: studio,
})
export const changeRole = defineRoute({
  id: 'studios.change-role', method: 'patch', path: '/api/studios/:studioId/members/:userId', access: { studio: 'studio.manage' },
  summary: 'Change a member’s role; a studio keeps at least one owner', params: memberParams,
  body: z.strictObject({ role: z.enum(roles) }), response: studio,
})
export const removeMember = defineRoute({
  id: 'studios.remove-member', method: 'delete', path: '/api/studios/:studioId/members/:userId', access: { studio: 'studio.manage' },
  summary: 'Remove a member', params: memberParams, response: studio,
})
