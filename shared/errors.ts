export const errorCodes = [
  'request.invalid', 'request.too-large', 'request.origin', 'request.too-many', 'not-found', 'not-allowed', 'sign-in.needed', 'sign-in.wrong',
  'sign-up.taken', 'password.weak', 'token.invalid', 'version.stale', 'state.wrong', 'photograph.type', 'photograph.too-large',
  'photograph.too-many-pixels', 'photograph.unreadable', 'photograph.missing', 'storage.full', 'database.away', 'chart.unreadable',
] as const
export type ErrorCode = (typeof errorCodes)[number]

/** A failure we expect and can explain. Anything else is a bug and stays a plain Error. */
export class DomainError extends Error {
  override readonly name = 'DomainError'
  constructor(
    readonly code: ErrorCode,
    /** a sentence for the person: what happened and what to do */
    message: string,
    /** for the form: field → sentence, or both states of a version clash */
    readonly details: Record<string, unknown> = {},
    options?: ErrorOptions,
  ) {
    super(message, options)
  }
}
