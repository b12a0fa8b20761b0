import { type FittingObservation } from '#shared/contracts/fitting.ts'

/** What a failed request means for the person: kept and tried again, made meanwhile by someone else, or not possible. */
export type ExplainedFailure = { kind: 'offline' | 'stale' | 'refused'; message: string; theirs?: FittingObservation; again: boolean }

type Known = { code?: unknown; message?: unknown; details?: { theirs?: unknown } }
/** Codes that say "not now" rather than "not this". */
const later = new Set(['database.away', 'request.too-many', 'offline', 'network', 'timeout', 'storage.full'])

export function explainFailure(failure: unknown): ExplainedFailure {
  const { code, message, details } = (typeof failure === 'object' && failure !== null ? failure : {}) as Known
  const text = typeof message === 'string' && message ? message : 'This did not reach the journal.'
  if (typeof code !== 'string') return { kind: 'offline', message: 'There is no connection.', again: true }
  if (code === 'version.stale') return { kind: 'stale', message: text, theirs: details?.theirs as FittingObservation | undefined, again: false }
  if (later.has(code)) return { kind: 'offline', message: text, again: true }
  return { kind: 'refused', message: text, again: false }
}
