import { z } from 'zod'
import { isoDateTime, lengthMm, person, projectParams, prose, version } from './common.ts'
import { defineRoute } from './route.ts'

export const checkGroups = ['fit', 'pattern', 'cloth'] as const
export const checkItem = z.object({
  id: z.string(), group: z.enum(checkGroups), title: z.string(),
  /** from what it was ticked, or what is still missing */
  support: z.string(),
  ticked: z.boolean(),
  /** ticked by the product from what it knows; a person cannot tick it */
  verified: z.boolean(),
})
export const clothFacts = z.strictObject({
  name: prose(120), widthMm: lengthMm.max(3000).nullable(), lengthMm: lengthMm.max(50_000).or(z.number().min(0).max(50_000)).nullable(),
  oneWay: z.boolean(), matching: z.boolean(),
  /** length the pattern asks for at its stated width */
  neededMm: z.number().min(0).max(50_000).nullable(), statedWidthMm: lengthMm.nullable(),
})
/** A measured square before and after washing and drying. */
export const shrinkage = z.strictObject({ markedMm: lengthMm.nullable(), lengthAfterMm: lengthMm.nullable(), widthAfterMm: lengthMm.nullable() })

export const finalCut = z.object({
  open: z.boolean(), beforeTheCut: z.array(z.string()), items: z.array(checkItem), cloth: clothFacts, shrinkage,
  agreedBy: z.object({ person, at: isoDateTime }).nullable(), clearedAt: isoDateTime.nullable(), cutAt: isoDateTime.nullable(), note: z.string(), version,
})
export type FinalCut = z.infer<typeof finalCut>

export const readFinalCut = defineRoute({
  id: 'final-cuts.read', method: 'get', path: '/api/projects/:projectId/final-cut', access: { project: 'project.read' },
  summary: 'The list before the good cloth is cut', params: projectParams, response: finalCut,
})
export const updateFinalCut = defineRoute({
  id: 'final-cuts.update', method: 'patch', path: '/api/projects/:projectId/final-cut', access: { project: 'project.edit' },
  summary: 'Tick items, describe the cloth, measure the test square', params: projectParams,
  body: z.strictObject({
    ticks: z.record(z.string().max(60), z.boolean()).optional(), cloth: clothFacts.optional(), shrinkage: shrinkage.optional(), note: prose(2000).optional(), version,
  }),
  response: finalCut,
})
export const agreeToCut = defineRoute({
  id: 'final-cuts.agree', method: 'put', path: '/api/projects/:projectId/final-cut/agreement', access: { project: 'cut.agree' },
  summary: 'The fitter agrees to the cut, or takes it back', params: projectParams, body: z.strictObject({ agreed: z.boolean() }), response: finalCut,
})
export const clearToCut = defineRoute({
  id: 'final-cuts.clear', method: 'post', path: '/api/projects/:projectId/final-cut/clear', access: { project: 'cut.clear' },
  summary: 'Clear the good cloth to be cut; refused while anything is open', params: projectParams, response: finalCut,
})
export const markCut = defineRoute({
  id: 'final-cuts.cut', method: 'post', path: '/api/projects/:projectId/final-cut/cut', access: { project: 'cut.clear' },
  summary: 'Say that the good cloth is cut', params: projectParams, response: finalCut,
})
export const cuttingSheetPdf = defineRoute({
  id: 'final-cuts.sheet', method: 'get', path: '/api/projects/:projectId/cutting-sheet.pdf', access: { project: 'project.read' },
  summary: 'The cutting sheet as PDF', params: projectParams,
  query: z.strictObject({ paper: z.enum(['a4', 'letter']).default('a4'), units: z.enum(['cm', 'inch']).default('cm') }), response: null, produces: 'application/pdf',
})
