/** Errors of the network, and PostgreSQL's classes 08 (connection), 53 (resources) and 57P (shut down). Source: PostgreSQL manual, appendix A. */
const networkCodes = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT', 'ENOTFOUND', 'EHOSTUNREACH', 'ENETUNREACH', 'EAI_AGAIN'])
const networkMessages = /connection terminated|timeout exceeded when trying to connect|client has encountered a connection error|not queryable/i

/** True when the failure is that the database cannot be reached, and not what was asked of it. Looks through wrapped causes. */
export function isDatabaseAway(thrown: unknown): boolean {
  for (let error = thrown, depth = 0; error instanceof Error && depth < 5; error = error.cause, depth++) {
    const code = 'code' in error && typeof error.code === 'string' ? error.code : ''
    if (networkCodes.has(code) || /^(08|53)[0-9A-Z]{3}$|^57P/.test(code) || networkMessages.test(error.message)) return true
    if (error instanceof AggregateError && error.errors.some(isDatabaseAway)) return true
  }
  return false
}
