import type { z } from 'zod'
import { type Permission } from './permissions.ts'

/**
 * Who may call a route. A studio route has `:studioId` in its path and a project route `:projectId`: the membership of the
 * caller is looked up by it, and what the caller may not see answers 404.
 */
export type Access = 'public' | 'signed-in' | { studio: Permission } | { project: Permission }

/** One route of the API: the server validates by it, the client calls by it, the OpenAPI document is made from it. */
export type Route = {
  /** dotted noun and verb, unique: `samples.read` */
  id: string
  method: 'get' | 'post' | 'put' | 'patch' | 'delete'
  /** Express path below the origin, with `:name` for parameters */
  path: `/api/${string}`
  summary: string
  access: Access
  params?: z.ZodObject
  query?: z.ZodObject
  body?: z.ZodType
  /** multipart with one file field `photograph` beside the body's fields */
  upload?: boolean
  /** JSON shape of the answer; `null` for an empty 204 or a file */
  response: z.ZodType | null
  /** media type when the answer is a file */
  produces?: string
  status?: 200 | 201 | 204
  /** a creating request that may be repeated with the same `Idempotency-Key` */
  idempotent?: boolean
}

export const defineRoute = <const R extends Route>(route: R): R => route

type Parsed<T> = T extends z.ZodType ? z.output<T> : undefined
export type RouteParams<R extends Route> = Parsed<R['params']>
export type RouteQuery<R extends Route> = Parsed<R['query']>
export type RouteBody<R extends Route> = Parsed<R['body']>
export type RouteResponse<R extends Route> = Parsed<R['response']>
export type RouteInput<R extends Route, Part extends 'params' | 'query' | 'body'> = R[Part] extends z.ZodType ? z.input<R[Part]> : undefined
