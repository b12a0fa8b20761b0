import { z } from 'zod'
import { id, isoDate, isoDateTime, lengthMm, line, prose, studioParams, version } from './common.ts'
import { defineRoute } from './route.ts'

export const measurement = z.object({
  code: z.string(),
  /** the value used: the mean of two readings, the median of three */
  valueMm: lengthMm,
  readingsMm: z.array(lengthMm).min(1).max(3),
})
export type Measurement = z.infer<typeof measurement>
export const measurementSet = z.object({
  id, wearerId: id, takenOn: isoDate, takenBy: z.string(), note: z.string(), measurements: z.array(measurement), version, updatedAt: isoDateTime,
})
export type MeasurementSet = z.infer<typeof measurementSet>

export const wearer = z.object({
  id, studioId: id, name: z.string(), note: z.string(), hasAccount: z.boolean(), version,
  projectCount: z.int(), latestSetOn: isoDate.nullable(),
})
export type Wearer = z.infer<typeof wearer>

const wearerParams = studioParams.extend({ wearerId: id })
const setInput = z.strictObject({
  takenOn: isoDate, takenBy: line(80), note: prose(1000).default(''),
  /** the readings as taken; the server works out the value by the tolerance rule */
  measurements: z.array(z.strictObject({ code: z.string().regex(/^[a-z][a-z0-9-]{1,40}$/), readingsMm: z.array(lengthMm.min(10)).min(1).max(3) })).max(80),
})

export const listWearers = defineRoute({
  id: 'wearers.list', method: 'get', path: '/api/studios/:studioId/wearers', access: { studio: 'wearer.read' },
  summary: 'The wearers of the studio', params: studioParams, response: z.object({ wearers: z.array(wearer) }),
})
export const createWearer = defineRoute({
  id: 'wearers.create', method: 'post', path: '/api/studios/:studioId/wearers', access: { studio: 'wearer.edit' }, status: 201, idempotent: true,
  summary: 'Add a wearer', params: studioParams, body: z.strictObject({ name: line(80), note: prose(1000).default('') }), response: wearer,
})
export const readWearer = defineRoute({
  id: 'wearers.read', method: 'get', path: '/api/studios/:studioId/wearers/:wearerId', access: { studio: 'wearer.read' },
  summary: 'A wearer with every dated set, newest first', params: wearerParams,
  response: z.object({ wearer, sets: z.array(measurementSet) }),
})
export const updateWearer = defineRoute({
  id: 'wearers.update', method: 'patch', path: '/api/studios/:studioId/wearers/:wearerId', access: { studio: 'wearer.edit' },
  summary: 'Rename a wearer or change the note', params: wearerParams,
  body: z.strictObject({ name: line(80).optional(), note: prose(1000).optional(), version }), response: wearer,
})
export const removeWearer = defineRoute({
  id: 'wearers.remove', method: 'delete', path: '/api/studios/:studioId/wearers/:wearerId', access: { studio: 'wearer.edit' }, status: 204,
  summary: 'Remove a wearer who has no project', params: wearerParams, response: null,
})
export const createSet = defineRoute({
  id: 'measurements.create', method: 'post', path: '/api/studios/:studioId/wearers/:wearerId/measurement-sets', access: { studio: 'wearer.edit' }, status: 201, idempotent: true,
  summary: 'Add a dated set of measurements', params: wearerParams, body: setInput, response: measurementSet,
})
export const updateSet = defineRoute({
  id: 'measurements.update', method: 'put', path: '/api/studios/:studioId/wearers/:wearerId/measurement-sets/:setId', access: { studio: 'wearer.edit' },
  summary: 'Correct a dated set', params: wearerParams.extend({ setId: id }), body: setInput.extend({ version }), response: measurementSet,
})
export const removeSet = defineRoute({
  id: 'measurements.remove', method: 'delete', path: '/api/studios/:studioId/wearers/:wearerId/measurement-sets/:setId', access: { studio: 'wearer.edit' }, status: 204,
  summary: 'Remove a dated set', params: wearerParams.extend({ setId: id }), response: null,
})
export const usualChange = z.object({
  cause: z.string(), title: z.string(), garmentFamily: z.string(), count: z.int(), medianMm: z.number(), leastMm: z.number(), mostMm: z.number(),
})
export const listUsualChanges = defineRoute({
  id: 'wearers.usual-changes', method: 'get', path: '/api/studios/:studioId/wearers/:wearerId/usual-changes', access: { studio: 'wearer.read' },
  summary: 'Changes that settled on this wearer at least twice', params: wearerParams,
  response: z.object({ usualChanges: z.array(usualChange) }),
})
