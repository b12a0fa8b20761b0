import { z } from 'zod'
import { garmentFeatures, garmentKinds, sleeveKinds, waistKinds } from '../fit/types.ts'
import { body, id, isoDateTime, lengthMm, line, prose, studioParams, version } from './common.ts'
import { defineRoute } from './route.ts'

export const garment = z.strictObject({
  kind: z.enum(garmentKinds),
  waist: z.enum(waistKinds).optional(),
  sleeves: z.enum(sleeveKinds).optional(),
  features: z.array(z.enum(garmentFeatures)).max(garmentFeatures.length).optional(),
})

/** How the size's line is printed on the sheet, so that the eye can keep to one line among many. */
export const lineStyles = ['solid', 'long-dash', 'short-dash', 'dotted', 'dash-dot', 'dash-dot-dot', 'heavy', 'double'] as const
export const sizeRow = z.strictObject({
  label: line(12),
  lineStyle: z.enum(lineStyles).optional(),
  /** body measurements the size is drafted for */
  body,
  /** finished measurements of the garment where the envelope gives them */
  finished: body.optional(),
})
export const sizeChart = z.array(sizeRow).max(40)
export type SizeRow = z.infer<typeof sizeRow>

const patternFields = {
  name: line(80),
  /** where it came from in the maker's own words: "own draft", "class sheet" */
  origin: prose(120).default(''),
  view: prose(40).default(''),
  garment,
  /** full bust minus high bust the pattern is drafted for */
  draftedCupMm: lengthMm.max(300).nullable().default(null),
  /** seam allowance printed on the pattern; 0 when it is drawn net */
  allowanceMm: lengthMm.max(100).default(15),
  note: prose(2000).default(''),
  chart: sizeChart.default([]),
}
export const patternInput = z.strictObject(patternFields)
export const pattern = z.object({ id, studioId: id, ...patternFields, version, updatedAt: isoDateTime, projectCount: z.int() })
export type Pattern = z.infer<typeof pattern>

const patternParams = studioParams.extend({ patternId: id })
export const listPatterns = defineRoute({
  id: 'patterns.list', method: 'get', path: '/api/studios/:studioId/patterns', access: { studio: 'pattern.read' },
  summary: 'The patterns of the studio', params: studioParams, response: z.object({ patterns: z.array(pattern) }),
})
export const createPattern = defineRoute({
  id: 'patterns.create', method: 'post', path: '/api/studios/:studioId/patterns', access: { studio: 'pattern.edit' }, status: 201, idempotent: true,
  summary: 'Add a pattern', params: studioParams, body: patternInput, response: pattern,
})
export const readPattern = defineRoute({
  id: 'patterns.read', method: 'get', path: '/api/studios/:studioId/patterns/:patternId', access: { studio: 'pattern.read' },
  summary: 'A pattern with its size chart', params: patternParams, response: pattern,
})
export const updatePattern = defineRoute({
  id: 'patterns.update', method: 'put', path: '/api/studios/:studioId/patterns/:patternId', access: { studio: 'pattern.edit' },
  summary: 'Change a pattern or its size chart', params: patternParams, body: patternInput.extend({ version }), response: pattern,
})
export const removePattern = defineRoute({
  id: 'patterns.remove', method: 'delete', path: '/api/studios/:studioId/patterns/:patternId', access: { studio: 'pattern.edit' }, status: 204,
  summary: 'Remove a pattern no project uses', params: patternParams, response: null,
})
