import { z } from 'zod'
import { views } from '../fit/types.ts'
import { id, isoDateTime, person, projectParams, prose, sampleParams, version } from './common.ts'
import { defineRoute } from './route.ts'

/** Limits said on screen and held by the server. */
export const photographLimits = {
  bytes: 25 * 1024 * 1024,
  pixels: 80_000_000,
  perSample: 40,
  types: ['image/jpeg', 'image/png', 'image/webp', 'image/avif', 'image/heic', 'image/heif'],
  quotaBytes: 5 * 1024 ** 3,
} as const

/** Longest edge in pixels of the three stored sizes. */
export const photographSizes = { thumb: 480, screen: 1280, full: 2560 } as const
export type PhotographSize = keyof typeof photographSizes

export const photograph = z.object({
  id, sampleNumber: z.int(), view: z.enum(views), caption: z.string(), width: z.int(), height: z.int(),
  /** a drawn illustration, said so beside it */
  drawing: z.boolean(),
  /** posture or movement: "standing", "arms raised" */
  pose: z.string(),
  takenBy: person, createdAt: isoDateTime, version,
})
export type Photograph = z.infer<typeof photograph>

const photographParams = projectParams.extend({ photographId: id })
export const uploadPhotograph = defineRoute({
  id: 'photographs.upload', method: 'post', path: '/api/projects/:projectId/samples/:number/photographs', access: { project: 'photograph.add' }, status: 201, idempotent: true, upload: true,
  summary: 'Add one photograph to a sample (multipart, file field `photograph`)', params: sampleParams,
  body: z.strictObject({ view: z.enum(views), caption: prose(200).default(''), pose: prose(60).default('') }), response: photograph,
})
export const updatePhotograph = defineRoute({
  id: 'photographs.update', method: 'patch', path: '/api/projects/:projectId/photographs/:photographId', access: { project: 'photograph.add' },
  summary: 'Change view, caption or pose', params: photographParams,
  body: z.strictObject({ view: z.enum(views).optional(), caption: prose(200).optional(), pose: prose(60).optional(), version }), response: photograph,
})
export const removePhotograph = defineRoute({
  id: 'photographs.remove', method: 'delete', path: '/api/projects/:projectId/photographs/:photographId', access: { project: 'photograph.add' }, status: 204,
  summary: 'Remove a photograph; it can be brought back for a while', params: photographParams, response: null,
})
export const restorePhotograph = defineRoute({
  id: 'photographs.restore', method: 'post', path: '/api/projects/:projectId/photographs/:photographId/restore', access: { project: 'photograph.add' },
  summary: 'Bring a removed photograph back', params: photographParams, response: photograph,
})
export const readPhotographFile = defineRoute({
  id: 'photographs.file', method: 'get', path: '/api/projects/:projectId/photographs/:photographId/:size', access: { project: 'project.read' },
  summary: 'The photograph itself, in one of three sizes', params: photographParams.extend({ size: z.enum(['thumb', 'screen', 'full']) }),
  response: null, produces: 'image/jpeg',
})
