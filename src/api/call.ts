import { apiError } from '#shared/contracts/common.ts'
import { type Route, type RouteInput, type RouteResponse } from '#shared/contracts/route.ts'

/** A request that did not do what was asked: refused by the server, or never there. The message is for the person. */
export class ApiError extends Error {
  override readonly name = 'ApiError'
  constructor(
    /** HTTP status; 0 when no answer came */
    readonly status: number,
    readonly code: string,
    message: string,
    readonly details: Record<string, unknown> = {},
    /** seconds to wait before trying again, where the server says so */
    readonly retryAfterSeconds: number | null = null,
  ) {
    super(message)
  }
}

type Part<R extends Route, P extends 'params' | 'query' | 'body'> = R[P] extends object ? { [key in P]: RouteInput<R, P> } : { [key in P]?: undefined }
export type CallOptions<R extends Route> = Part<R, 'params'> & (R['query'] extends object ? { query?: RouteInput<R, 'query'> } : { query?: undefined }) & Part<R, 'body'> & {
  signal?: AbortSignal
  /** the same key for the same intent: a repeated request then makes one thing */
  idempotencyKey?: string
}

const lostConnection = 'The connection dropped. Nothing is lost; try again when you are back on the line.'
let onSignedOut: () => void = () => {}
/** The answer cannot be used: usually this page is older than the server that answered. */
const unreadable = (status: number) => new ApiError(status, 'answer.unreadable', 'The journal answered in a way this page does not know. Load the page again.')

/** What happens when the server says that nobody is signed in any more. */
export const whenSignedOut = (run: () => void) => { onSignedOut = run }

/** Address of a route with its parameters and query filled in. */
export function addressOf(route: Route, params: Record<string, unknown> = {}, query: Record<string, unknown> = {}): string {
  const path = route.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(params[name])))
  const search = new URLSearchParams(Object.entries(query).filter(([, value]) => value !== undefined && value !== null && value !== '').map(([name, value]) => [name, String(value)]))
  return search.size ? `${path}?${search}` : path
}

/** The error an answer carries, in the person's words. That nobody is signed in any more is also told to `whenSignedOut`. */
export function readRefusal(status: number, body: unknown, retryAfter: string | null): ApiError {
  const parsed = apiError.safeParse(body)
  const seconds = retryAfter === null ? null : Number(retryAfter) || null
  if (parsed.success && parsed.data.error.code === 'sign-in.needed') onSignedOut()
  if (parsed.success) return new ApiError(status, parsed.data.error.code, parsed.data.error.message, parsed.data.error.details, seconds)
  return new ApiError(status, 'network', status >= 500 ? 'The journal could not answer. Try again in a moment.' : lostConnection, {}, seconds)
}

/** The answer as the contract describes it. @throws ApiError when it is something else */
export function readAnswer<R extends Route>(route: R, status: number, answer: unknown): RouteResponse<R> {
  const read = route.response?.safeParse(answer)
  if (read && !read.success) throw unreadable(status)
  return read?.data as RouteResponse<R>
}

/**
 * Calls a route of the API by its contract and gives the checked answer.
 * @throws ApiError with the server's sentence, or with `network` when no answer came
 */
export async function call<const R extends Route>(route: R, ...[options]: object extends CallOptions<R> ? [options?: CallOptions<R>] : [options: CallOptions<R>]): Promise<RouteResponse<R>> {
  const { params, query, body, signal, idempotencyKey } = (options ?? {}) as { params?: object; query?: object; body?: unknown; signal?: AbortSignal; idempotencyKey?: string }
  let response: Response
  try {
    response = await fetch(addressOf(route, { ...params }, { ...query }), {
      method: route.method.toUpperCase(), credentials: 'same-origin', signal,
      headers: {
        Accept: 'application/json',
        ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
        ...(idempotencyKey ? { 'Idempotency-Key': idempotencyKey } : {}),
      },
      body: body === undefined ? undefined : JSON.stringify(body),
    })
  } catch (failure) {
    if (signal?.aborted) throw failure
    throw new ApiError(0, 'network', lostConnection)
  }
  if (!response.ok) {
    throw readRefusal(response.status, await response.json().catch(() => null), response.headers.get('Retry-After'))
  }
  if (!route.response) return undefined as RouteResponse<R>
  let answer: unknown
  try {
    answer = await response.json()
  } catch (failure) {
    if (signal?.aborted) throw failure
    throw failure instanceof SyntaxError ? unreadable(response.status) : new ApiError(0, 'network', lostConnection)
  }
  return readAnswer(route, response.status, answer)
}
