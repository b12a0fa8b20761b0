import { type Request, type Response, type Router } from 'express'
import { z } from 'zod'
import { type Queryable } from '#db/client.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type MembershipRow } from '#db/schema/studios.ts'
import { type Permission } from '#shared/contracts/permissions.ts'
import { type Route, type RouteBody, type RouteParams, type RouteQuery } from '#shared/contracts/route.ts'
import { type SignedIn, checkAccess } from '../access/checkAccess.ts'
import { type AppContext } from '../context.ts'
import { checkText } from './checkText.ts'
import { currentUser } from './currentUser.ts'
import { runOnce } from './idempotency.ts'
import { parsePart } from './parsePart.ts'
import { limitBeforeBody, limitByBody } from './rateLimits.ts'
import { type ReceivedFile, receiveBody } from './receiveBody.ts'

type OfStudio = { studio: Permission } | { project: Permission }

/** What a handler is given: everything checked and parsed by the route's contract. */
export type Call<R extends Route> = {
  params: RouteParams<R>
  query: RouteQuery<R>
  body: RouteBody<R>
  /** null only on public routes */
  user: R['access'] extends 'public' ? SignedIn | null : SignedIn
  /** the caller's membership on studio and project routes */
  membership: R['access'] extends OfStudio ? MembershipRow : null
  /** the project on project routes, seen with the caller's rights */
  project: R['access'] extends { project: Permission } ? ProjectRow : null
  /** the uploaded file on upload routes; removed after the handler, whatever happens */
  file: R['upload'] extends true ? ReceivedFile : null
  /**
   * Where this call reads and writes. On a route with `idempotent` it is the transaction that also holds the request key, so
   * that a repeated request makes one thing even after a crash: build the service with it, not with `context.db`.
   */
  db: Queryable
  /**
   * An id for the thing a creating route makes; the same again when the request is repeated with its key. Upload routes run
   * outside a transaction and use it for their row, so that a repeated upload finds what the first one made.
   */
  createdId: string
  req: Request
  res: Response
}
/** The answer as the contract says it; nothing for an empty 204, or for a file the handler writes to `res` itself. */
export type Answer<R extends Route> = R['response'] extends z.ZodType ? z.output<R['response']> : void
export type Handler<R extends Route> = (call: Call<R>) => Answer<R> | Promise<Answer<R>>

/** A route that names no query takes none: a misspelt filter is an error and not everything. */
const noQuery = z.strictObject({})

const served = new WeakMap<Router, Route[]>()
/** The contracts registered on a router so far. */
export const routesOf = (router: Router): readonly Route[] => served.get(router) ?? []

/**
 * Registers a contract's route. In this order: access, rate limits, body, parsing, handler, answer; so what the caller may not
 * see answers 404 before a byte of the body is read.
 */
export function serve<const R extends Route>(router: Router, context: AppContext, route: R, handler: Handler<R>): void {
  served.set(router, [...routesOf(router), route])
  router[route.method](route.path, async (req, res) => {
    const user = currentUser(req)
    const granted = await checkAccess(context.db, route.access, user, req.params)
    await limitBeforeBody(context, route, req, user)
    const received = await receiveBody(route, req, res)
    let answer: unknown
    try {
      checkText([req.params, req.query, received.body])
      const call = {
        params: parsePart(route.params, req.params, 'address'),
        query: route.query ? parsePart(route.query, req.query, 'query') : void parsePart(noQuery, req.query, 'query'),
        body: parsePart(route.body, received.body, 'request'),
        ...granted, file: received.file, req, res,
      }
      await limitByBody(context, route, req, call.body)
      // The compiler cannot follow the conditional types through the parsing; the contract holds them together.
      const run = (db: Queryable, createdId: string) => Promise.resolve(handler({ ...call, db, createdId } as unknown as Call<R>))
      answer = await runOnce(context, route, req, user, call.body, async (db, createdId) => checkAnswer(context, route, await run(db, createdId)))
    } finally {
      // before the answer: who has it may count on nothing of the upload lying about
      await received.remove()
    }
    if (!res.headersSent && !route.produces) send(res, route, answer)
  })
}

function send(res: Response, route: Route, answer: unknown): void {
  const status = route.status ?? (route.response ? 200 : 204)
  if (route.response) res.status(status).json(answer)
  else res.status(status).end()
}

/** Sends only what the contract names. A mismatch is a bug: an error here and in tests, a line in the log in production. */
function checkAnswer(context: AppContext, route: Route, answer: unknown): unknown {
  if (!route.response) return undefined
  const read = route.response.safeParse(answer)
  if (read.success) return read.data
  if (context.settings.mode === 'local') throw new Error(`The answer of ${route.id} does not keep its contract: ${read.error.message}`)
  context.logger.error({ route: route.id, issues: read.error.issues.map((issue) => ({ path: issue.path, code: issue.code })) }, 'answer does not keep its contract')
  return answer
}
