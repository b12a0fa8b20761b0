import { z } from 'zod'
import { pieceRoles } from '../fit/types.ts'
import { id, isoDateTime, lengthMm, line, projectParams, prose, version } from './common.ts'
import { defineRoute } from './route.ts'

export const markStates = ['missing', 'marked', 'not-needed'] as const
/** A mark a tracing must carry → whether it is on the paper (the kinds are those of shared/tracing). */
export const tracingMarks = z.record(z.string().regex(/^[a-z][a-z-]{1,30}$/), z.enum(markStates))

const pieceFields = {
  role: z.enum(pieceRoles),
  name: line(60),
  view: prose(40).default(''),
  cutCount: z.int().min(1).max(20),
  onFold: z.boolean(),
  /** number of each on the piece; null where not counted yet */
  notchCount: z.int().min(0).max(40).nullable().default(null),
  dartCount: z.int().min(0).max(12).nullable().default(null),
  allowanceMm: lengthMm.max(100),
  marks: tracingMarks,
  /** where the tracing hangs: "hook 3, with the skirts" */
  hangs: prose(120).default(''),
}
export const piece = z.object({
  id, number: z.int(), ...pieceFields,
  /** "14", or "14 to 16" where it blends */
  sizeLabel: z.string(),
  /** marks that are needed and not there yet */
  missing: z.array(z.string()),
  /** changes that touch this piece, and whether each is drawn on it */
  changes: z.array(z.object({ changeId: id, title: z.string(), amountMm: z.number(), sampleNumber: z.int(), transferred: z.boolean(), follows: z.boolean() })),
  version, updatedAt: isoDateTime,
})
export type Piece = z.infer<typeof piece>
export const tracing = z.object({
  pieces: z.array(piece), ready: z.boolean(),
  /** the last look, before the weights come off */
  lastLookAt: isoDateTime.nullable(),
})

const pieceParams = projectParams.extend({ pieceId: id })
export const listPieces = defineRoute({
  id: 'pieces.list', method: 'get', path: '/api/projects/:projectId/pieces', access: { project: 'project.read' },
  summary: 'The tracing list', params: projectParams, response: tracing,
})
export const startPieces = defineRoute({
  id: 'pieces.start', method: 'post', path: '/api/projects/:projectId/pieces/from-template', access: { project: 'project.edit' }, status: 201,
  summary: 'Fill an empty tracing list with the usual pieces of this garment', params: projectParams, response: tracing,
})
export const createPiece = defineRoute({
  id: 'pieces.create', method: 'post', path: '/api/projects/:projectId/pieces', access: { project: 'project.edit' }, status: 201, idempotent: true,
  summary: 'Add a piece', params: projectParams, body: z.strictObject(pieceFields), response: piece,
})
export const updatePiece = defineRoute({
  id: 'pieces.update', method: 'patch', path: '/api/projects/:projectId/pieces/:pieceId', access: { project: 'project.edit' },
  summary: 'Tick marks, rename, say where it hangs', params: pieceParams,
  body: z.strictObject({
    role: pieceFields.role.optional(), name: line(60).optional(), view: prose(40).optional(), cutCount: pieceFields.cutCount.optional(), onFold: z.boolean().optional(),
    notchCount: z.int().min(0).max(40).nullable().optional(), dartCount: z.int().min(0).max(12).nullable().optional(), allowanceMm: pieceFields.allowanceMm.optional(),
    marks: tracingMarks.optional(), hangs: prose(120).optional(), version,
  }),
  response: piece,
})
export const removePiece = defineRoute({
  id: 'pieces.remove', method: 'delete', path: '/api/projects/:projectId/pieces/:pieceId', access: { project: 'project.edit' }, status: 204,
  summary: 'Take a piece off the list', params: pieceParams, response: null,
})
export const confirmTracing = defineRoute({
  id: 'pieces.last-look', method: 'post', path: '/api/projects/:projectId/pieces/last-look', access: { project: 'project.edit' },
  summary: 'Confirm the last look; refused while a mark is missing', params: projectParams, response: tracing,
})
export const setTransfer = defineRoute({
  id: 'pieces.transfer', method: 'put', path: '/api/projects/:projectId/pieces/:pieceId/transfers/:changeId', access: { project: 'project.edit' },
  summary: 'Tick a change as drawn on this piece, or untick it', params: pieceParams.extend({ changeId: id }),
  body: z.strictObject({ transferred: z.boolean() }), response: piece,
})
