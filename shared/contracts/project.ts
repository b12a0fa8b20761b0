import { z } from 'zod'
import { id, isoDateTime, line, person, projectParams, prose, studioParams, version } from './common.ts'
import { garment, pattern } from './pattern.ts'
import { roles } from './permissions.ts'
import { defineRoute } from './route.ts'
import { measurementSet } from './wearer.ts'

export const stages = ['size', 'sample', 'cleared', 'cut', 'resting'] as const
export const sampleStates = ['to-sew', 'to-photograph', 'with-fitter', 'reviewed', 'closed'] as const
/** What the shelf is filtered by: what is needed next. */
export const shelfFilters = ['all', 'to-size', 'in-fitting', 'with-fitter', 'cleared', 'resting'] as const

/** One card on the shelf. */
export const projectCard = z.object({
  id, name: z.string(), garment, wearer: person, stage: z.enum(stages),
  sample: z.object({ number: z.int(), state: z.enum(sampleStates) }).nullable(),
  /** observations neither settled nor let be */
  openCount: z.int(),
  /** parts of the thread already sewn, 0..1 */
  progress: z.number(),
  nextFittingAt: isoDateTime.nullable(),
  coverPhotographId: id.nullable(),
  updatedAt: isoDateTime,
})
export type ProjectCard = z.infer<typeof projectCard>

/** What every page of a project needs: the header and its tabs. */
export const project = projectCard.extend({
  studioId: id, studioName: z.string(), version, note: z.string(), pattern,
  /** the caller's role in the studio */
  role: z.enum(roles),
  latestSet: measurementSet.nullable(),
  samples: z.array(z.object({ number: z.int(), state: z.enum(sampleStates) })),
  sizeKept: z.boolean(),
  /** what still stands between this project and the final cut, in words; empty when it is open */
  beforeTheCut: z.array(z.string()),
  createdAt: isoDateTime,
})
export type Project = z.infer<typeof project>

export const listProjects = defineRoute({
  id: 'projects.list', method: 'get', path: '/api/studios/:studioId/projects', access: { studio: 'project.list' },
  summary: 'The shelf: newest work first, a page at a time', params: studioParams,
  query: z.strictObject({
    filter: z.enum(shelfFilters).default('all'),
    /** words of the garment's, pattern's or wearer's name */
    q: z.string().normalize('NFC').trim().max(80).optional(),
    after: z.string().max(200).optional(),
    limit: z.coerce.number().int().min(1).max(60).default(24),
  }),
  response: z.object({
    projects: z.array(projectCard),
    /** how many wait under each filter */
    counts: z.record(z.enum(shelfFilters), z.int()),
    next: z.string().nullable(),
  }),
})
export const createProject = defineRoute({
  id: 'projects.create', method: 'post', path: '/api/studios/:studioId/projects', access: { studio: 'project.create' }, status: 201, idempotent: true,
  summary: 'Hang a new garment', params: studioParams,
  body: z.strictObject({ name: line(80), wearerId: id, patternId: id, note: prose(2000).default('') }),
  response: project,
})
export const readProject = defineRoute({
  id: 'projects.read', method: 'get', path: '/api/projects/:projectId', access: { project: 'project.read' },
  summary: 'A project’s head: garment, wearer, pattern, samples', params: projectParams, response: project,
})
export const updateProject = defineRoute({
  id: 'projects.update', method: 'patch', path: '/api/projects/:projectId', access: { project: 'project.edit' },
  summary: 'Rename, note, set the next fitting, rest or wake', params: projectParams,
  body: z.strictObject({
    name: line(80).optional(), note: prose(2000).optional(), nextFittingAt: isoDateTime.nullable().optional(), resting: z.boolean().optional(), version,
  }),
  response: project,
})
export const removeProject = defineRoute({
  id: 'projects.remove', method: 'delete', path: '/api/projects/:projectId', access: { project: 'project.edit' }, status: 204,
  summary: 'Remove a project with its photographs', params: projectParams, response: null,
})

export const comment = z.object({ id, author: person, text: z.string(), sampleNumber: z.int().nullable(), createdAt: isoDateTime })
export const listComments = defineRoute({
  id: 'comments.list', method: 'get', path: '/api/projects/:projectId/comments', access: { project: 'project.read' },
  summary: 'What was said about this project, newest first', params: projectParams, response: z.object({ comments: z.array(comment) }),
})
export const createComment = defineRoute({
  id: 'comments.create', method: 'post', path: '/api/projects/:projectId/comments', access: { project: 'comment.add' }, status: 201, idempotent: true,
  summary: 'Say something about this project', params: projectParams,
  body: z.strictObject({ text: prose(2000).min(1), sampleNumber: z.int().min(1).nullable().default(null) }), response: comment,
})
