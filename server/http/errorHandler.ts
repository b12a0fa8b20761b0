import { type ErrorRequestHandler } from 'express'
import multer from 'multer'
import { type Logger } from 'pino'
import { DomainError, type ErrorCode } from '#shared/errors.ts'
import { isDatabaseAway } from './isDatabaseAway.ts'

/** A code without a status does not compile. */
export const statusOf: Record<ErrorCode, number> = {
  'request.invalid': 400, 'request.too-large': 413, 'request.origin': 403, 'request.too-many': 429, 'not-found': 404, 'not-allowed': 403,
  'sign-in.needed': 401, 'sign-in.wrong': 401, 'sign-up.taken': 409, 'password.weak': 400, 'token.invalid': 400, 'version.stale': 409,
  'state.wrong': 409, 'photograph.type': 415, 'photograph.too-large': 413, 'photograph.too-many-pixels': 413, 'photograph.unreadable': 422,
  'photograph.missing': 400, 'storage.full': 507, 'database.away': 503, 'chart.unreadable': 422,
}

/** Seconds a client should wait before it asks a database that is away again. */
export const databaseRetrySeconds = 5

/** Turns whatever was thrown into one shape; what nobody expected is logged whole and answered without its insides. */
export const errorHandler = (logger: Logger): ErrorRequestHandler => (thrown, req, res, next) => {
  if (res.headersSent) return next(thrown)
  const error = expected(thrown)
  const requestId = req.id ?? ''
  if (!error) {
    logger.error({ err: thrown, requestId }, 'unexpected error')
    res.status(500).json({ error: { code: 'server.failed', message: 'Something went wrong on the server. Nothing was changed; try again.', details: {}, requestId } })
    return
  }
  if (error.code === 'database.away') {
    logger.warn({ requestId, reason: (thrown as Error).message }, 'database away')
    res.set('Retry-After', String(databaseRetrySeconds))
  }
  const { retryAfterSeconds } = error.details
  if (typeof retryAfterSeconds === 'number') res.set('Retry-After', String(retryAfterSeconds))
  res.status(statusOf[error.code]).json({ error: { code: error.code, message: error.message, details: error.details, requestId } })
}

function expected(thrown: unknown): DomainError | null {
  if (thrown instanceof DomainError) return thrown
  if (thrown instanceof multer.MulterError) return fromMulter(thrown)
  if (isDatabaseAway(thrown)) return new DomainError('database.away', 'The journal cannot reach its database just now. Nothing is lost; try again in a moment.')
  return fromBodyParser(thrown)
}

function fromMulter(thrown: multer.MulterError): DomainError {
  if (thrown.code === 'LIMIT_FILE_SIZE') return new DomainError('photograph.too-large', 'This photograph is larger than 25 MB. Choose a smaller one, or save it at a lower quality.')
  if (thrown.code === 'LIMIT_UNEXPECTED_FILE' || thrown.code === 'LIMIT_FILE_COUNT') {
    return new DomainError('request.invalid', 'Send one file in the field “photograph”.', { photograph: 'Send one file.' })
  }
  return new DomainError('request.invalid', 'The form could not be read: it has too many or too long fields.')
}

/** body-parser and Express mark what the client did wrong with a status and a type. */
function fromBodyParser(thrown: unknown): DomainError | null {
  if (!(thrown instanceof Error) || !('status' in thrown) || typeof thrown.status !== 'number' || thrown.status >= 500) return null
  if (thrown.status === 413) return new DomainError('request.too-large', 'This is more than the server takes in one request. Send less at once.')
  return new DomainError('request.invalid', 'The request could not be read. Check that it is valid JSON in UTF-8.')
}
