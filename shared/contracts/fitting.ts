import { z } from 'zod'
import { type Diagnosis, type PaperChange, amountKinds, directions, lines, pieceRoles, sides, signs, targets, views, zones } from '../fit/types.ts'
import { amountMm, id, isoDate, isoDateTime, lengthMm, line, person, projectParams, prose, sampleParams, version } from './common.ts'
import { photograph } from './photograph.ts'
import { sampleStates } from './project.ts'
import { defineRoute } from './route.ts'

/* ---- samples */
const sampleFields = {
  cloth: prose(120),
  /** how the sample's cloth differs from the final cloth */
  differs: prose(400),
  stiffer: z.boolean(),
  stretchPercent: z.number().min(0).max(200).nullable(),
  finalStretchPercent: z.number().min(0).max(200).nullable(),
  /** what was only basted */
  basted: prose(400),
  sewnOn: isoDate.nullable(),
  note: prose(2000),
}
export const sample = z.object({ id, number: z.int(), state: z.enum(sampleStates), ...sampleFields, version, createdAt: isoDateTime })
export type Sample = z.infer<typeof sample>

/* ---- observations */
export const amount = z.strictObject({ mm: lengthMm.max(500), as: z.enum(amountKinds) })
export const markKinds = ['drag-line', 'gape', 'tight', 'excess', 'length', 'balance', 'place'] as const
export const point = z.tuple([z.number().min(0).max(1), z.number().min(0).max(1)])
/** A mark on a photograph; points are fractions of the picture. */
export const mark = z.strictObject({ kind: z.enum(markKinds), shape: z.enum(['stroke', 'point', 'area']), points: z.array(point).min(1).max(200) })
export type Mark = z.infer<typeof mark>

export const observationStates = ['noted', 'chosen', 'carried', 'settled', 'let-be'] as const
const observationFields = {
  photographId: id.nullable(),
  mark: mark.nullable(),
  sign: z.enum(signs), zone: z.enum(zones), view: z.enum(views), side: z.enum(sides),
  direction: z.enum(directions).nullable(), towards: z.enum(targets).nullable(), line: z.enum(lines).nullable(),
  severity: z.union([z.literal(1), z.literal(2), z.literal(3)]),
  amount: amount.nullable(),
  note: prose(1000),
}
export const outcomes = ['settled', 'better', 'same', 'worse', 'overdone'] as const
/** An observation looked at again on a later sample. */
export const reading = z.object({
  observationId: id, sampleNumber: z.int(), gone: z.boolean(), amount: amount.nullable(),
  /** a reading the other way: slack where it was tight */
  reversed: z.boolean(),
  note: z.string(), outcome: z.enum(outcomes).nullable(), at: isoDateTime, by: person,
})
export type Reading = z.infer<typeof reading>
export const observation = z.object({
  id, number: z.int(), sampleNumber: z.int(), ...observationFields, state: z.enum(observationStates), letBeReason: z.string(),
  readings: z.array(reading),
  /** what the change carried into the newest sample should leave, cloth in mm */
  predicted: z.object({ sampleNumber: z.int(), expectedMm: z.number(), changeMm: z.number(), text: z.string() }).nullable(),
  by: person, createdAt: isoDateTime, version,
})
export type FittingObservation = z.infer<typeof observation>

/* ---- changes */
export const decisions = ['accepted', 'altered', 'declined', 'own'] as const
export const declineReasons = ['other-cause', 'too-small', 'style', 'other'] as const
export const change = z.object({
  id, sampleNumber: z.int(), cause: z.string().nullable(), decision: z.enum(decisions), title: z.string(),
  suggestedMm: z.number().nullable(), amountMm: z.number(),
  paper: z.custom<PaperChange>((value) => typeof value === 'object' && value !== null),
  observationIds: z.array(id), reason: z.enum(declineReasons).nullable(), note: z.string(),
  carriedTo: z.int().nullable(), by: person, at: isoDateTime, version,
  /** pieces this change touches and whether it is drawn on them */
  transfers: z.array(z.object({ pieceId: id, pieceName: z.string(), transferred: z.boolean() })),
})
export type Change = z.infer<typeof change>

/** Everything the fitting screen shows for one sample. */
export const fitting = z.object({
  sample,
  photographs: z.array(photograph),
  /** observations first seen on this sample, and those of earlier samples that are asked again here */
  observations: z.array(observation),
  changes: z.array(change),
  /** changes the sample was sewn with */
  carriedIn: z.array(change),
  answers: z.record(z.string(), z.enum(['yes', 'no'])),
  diagnosis: z.custom<Diagnosis>((value) => typeof value === 'object' && value !== null),
})
export type Fitting = z.infer<typeof fitting>

export const startSample = defineRoute({
  id: 'samples.start', method: 'post', path: '/api/projects/:projectId/samples', access: { project: 'project.edit' }, status: 201, idempotent: true,
  summary: 'Start the next sample with the accepted changes carried in', params: projectParams,
  body: z.strictObject({ cloth: sampleFields.cloth.default('') }), response: sample,
})
export const readFitting = defineRoute({
  id: 'samples.read', method: 'get', path: '/api/projects/:projectId/samples/:number', access: { project: 'project.read' },
  summary: 'One sample: photographs, observations, suggestions, changes', params: sampleParams, response: fitting,
})
export const updateSample = defineRoute({
  id: 'samples.update', method: 'patch', path: '/api/projects/:projectId/samples/:number', access: { project: 'fitting.mark' },
  summary: 'Say how the sample was sewn, or move it on', params: sampleParams,
  body: z.strictObject({
    cloth: sampleFields.cloth.optional(), differs: sampleFields.differs.optional(), stiffer: z.boolean().optional(),
    stretchPercent: sampleFields.stretchPercent.optional(), finalStretchPercent: sampleFields.finalStretchPercent.optional(),
    basted: sampleFields.basted.optional(), sewnOn: sampleFields.sewnOn.optional(), note: sampleFields.note.optional(),
    state: z.enum(sampleStates).optional(), version,
  }),
  response: sample,
})

const observationParams = projectParams.extend({ observationId: id })
export const observationInput = z.strictObject(observationFields)
export const createObservation = defineRoute({
  id: 'observations.create', method: 'post', path: '/api/projects/:projectId/samples/:number/observations', access: { project: 'fitting.mark' }, status: 201, idempotent: true,
  summary: 'Note what the cloth shows', params: sampleParams, body: observationInput, response: observation,
})
export const updateObservation = defineRoute({
  id: 'observations.update', method: 'patch', path: '/api/projects/:projectId/observations/:observationId', access: { project: 'fitting.mark' },
  summary: 'Correct an observation, let it be or take it up again', params: observationParams,
  body: observationInput.partial().extend({ letBe: z.strictObject({ reason: line(200) }).nullable().optional(), version }), response: observation,
})
export const removeObservation = defineRoute({
  id: 'observations.remove', method: 'delete', path: '/api/projects/:projectId/observations/:observationId', access: { project: 'fitting.mark' }, status: 204,
  summary: 'Remove an observation; it can be brought back', params: observationParams, response: null,
})
export const restoreObservation = defineRoute({
  id: 'observations.restore', method: 'post', path: '/api/projects/:projectId/observations/:observationId/restore', access: { project: 'fitting.mark' },
  summary: 'Bring a removed observation back', params: observationParams, response: observation,
})
export const putReading = defineRoute({
  id: 'readings.put', method: 'put', path: '/api/projects/:projectId/samples/:number/readings/:observationId', access: { project: 'fitting.mark' },
  summary: 'Look at an earlier observation again on this sample', params: sampleParams.extend({ observationId: id }),
  body: z.strictObject({ gone: z.boolean(), reversed: z.boolean().default(false), amount: amount.nullable(), note: prose(400).default('') }), response: observation,
})
export const removeReading = defineRoute({
  id: 'readings.remove', method: 'delete', path: '/api/projects/:projectId/samples/:number/readings/:observationId', access: { project: 'fitting.mark' },
  summary: 'Take a reading back', params: sampleParams.extend({ observationId: id }), response: observation,
})
export const putAnswer = defineRoute({
  id: 'answers.put', method: 'put', path: '/api/projects/:projectId/samples/:number/answers/:checkId', access: { project: 'fitting.mark' }, status: 204,
  summary: 'Answer a check that tells two causes apart', params: sampleParams.extend({ checkId: z.string().regex(/^[a-z0-9~-]{3,120}$/) }),
  body: z.strictObject({ answer: z.enum(['yes', 'no']).nullable() }), response: null,
})

const changeParams = projectParams.extend({ changeId: id })
export const decideChange = defineRoute({
  id: 'changes.decide', method: 'post', path: '/api/projects/:projectId/samples/:number/changes', access: { project: 'change.decide' }, status: 201, idempotent: true,
  summary: 'Accept, alter or decline a suggestion', params: sampleParams,
  body: z.strictObject({
    cause: z.string().regex(/^[a-z0-9-]{2,80}$/), side: z.enum(sides),
    decision: z.enum(['accepted', 'altered', 'declined']),
    amountMm: amountMm.optional(),
    /** leave out pieces of the suggestion */
    pieceRoles: z.array(z.enum(pieceRoles)).max(pieceRoles.length).optional(),
    reason: z.enum(declineReasons).optional(), note: prose(1000).default(''),
  }),
  response: change,
})
export const createOwnChange = defineRoute({
  id: 'changes.own', method: 'post', path: '/api/projects/:projectId/samples/:number/own-changes', access: { project: 'change.decide' }, status: 201, idempotent: true,
  summary: 'Write a change of one’s own', params: sampleParams,
  body: z.strictObject({
    title: line(120), note: prose(2000).default(''), observationIds: z.array(id).max(40),
    steps: z.array(z.strictObject({ pieceRole: z.enum(pieceRoles), side: z.enum(['both', 'left', 'right']), edge: line(60), amountMm, edges: z.int().min(1).max(8).default(1), taper: prose(80).optional() })).min(1).max(20),
  }),
  response: change,
})
export const updateChange = defineRoute({
  id: 'changes.update', method: 'patch', path: '/api/projects/:projectId/changes/:changeId', access: { project: 'change.decide' },
  summary: 'Alter the amount, the pieces or the note of a decision', params: changeParams,
  body: z.strictObject({ amountMm: amountMm.optional(), pieceRoles: z.array(z.enum(pieceRoles)).max(pieceRoles.length).optional(), note: prose(1000).optional(), version }), response: change,
})
export const takeBackChange = defineRoute({
  id: 'changes.take-back', method: 'delete', path: '/api/projects/:projectId/changes/:changeId', access: { project: 'change.decide' }, status: 204,
  summary: 'Take a decision back; its observations are noted again', params: changeParams, response: null,
})

/* ---- the ledger: what was changed on which piece so far */
export const ledgerLine = z.object({
  changeId: id, sampleNumber: z.int(), carriedTo: z.int().nullable(), title: z.string(), edge: z.string(), amountMm: z.number(),
  side: z.enum(['both', 'left', 'right']), transferred: z.boolean(),
})
export const ledger = z.object({
  pieces: z.array(z.object({
    pieceId: id.nullable(), pieceRole: z.enum(pieceRoles), pieceName: z.string(),
    lines: z.array(ledgerLine),
    /** edge → sum of everything changed there, mm */
    totals: z.array(z.object({ edge: z.string(), side: z.enum(['both', 'left', 'right']), amountMm: z.number() })),
  })),
})
export const readLedger = defineRoute({
  id: 'changes.ledger', method: 'get', path: '/api/projects/:projectId/ledger', access: { project: 'project.read' },
  summary: 'Everything changed so far, piece by piece', params: projectParams, response: ledger,
})
export const readStory = defineRoute({
  id: 'projects.story', method: 'get', path: '/api/projects/:projectId/story', access: { project: 'project.read' },
  summary: 'Every sample in order, for comparing and for the story on one page', params: projectParams,
  response: z.object({ samples: z.array(fitting.omit({ diagnosis: true, answers: true })) }),
})
