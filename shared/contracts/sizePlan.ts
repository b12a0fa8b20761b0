import { z } from 'zod'
import { isoDateTime, projectParams, prose, version } from './common.ts'
import { pattern } from './pattern.ts'
import { defineRoute } from './route.ts'
import { measurementSet } from './wearer.ts'

/** Measurement code → the size label the maker chose for that level. */
export const sizeChoices = z.record(z.string().regex(/^[a-z][a-z0-9-]{1,40}$/), z.string().max(12))

/** What the size plan is worked out from (the plan itself is `sizePlan()` of shared/fit), and what was kept. */
export const sizePlanState = z.object({
  pattern,
  /** the set the plan reads: the one it was kept with, else the wearer's newest */
  set: measurementSet.nullable(),
  choices: sizeChoices,
  reason: z.string(),
  /** lengthen or shorten before tracing: measurement code → mm on the paper */
  lengthsMm: z.record(z.string(), z.number()),
  keptAt: isoDateTime.nullable(),
  version,
})
export type SizePlanState = z.infer<typeof sizePlanState>

export const readSizePlan = defineRoute({
  id: 'size-plans.read', method: 'get', path: '/api/projects/:projectId/size-plan', access: { project: 'project.read' },
  summary: 'Chart, measurements and the sizes chosen', params: projectParams, response: sizePlanState,
})
export const updateSizePlan = defineRoute({
  id: 'size-plans.update', method: 'put', path: '/api/projects/:projectId/size-plan', access: { project: 'project.edit' },
  summary: 'Choose sizes; with `keep`, go on to the tracing', params: projectParams,
  body: z.strictObject({
    choices: sizeChoices, reason: prose(1000).default(''), lengthsMm: z.record(z.string().max(40), z.number().min(-300).max(300)).default({}), keep: z.boolean().default(false), version,
  }),
  response: sizePlanState,
})
