import { randomUUID } from 'node:crypto'
import { type RequestHandler } from 'express'
import { type DestinationStream, type Logger, pino } from 'pino'
import { describeError } from './describeError.ts'

declare module 'express-serve-static-core' {
  interface Request {
    /** our own, new for every request */
    id: string
  }
}

/** The process log: never a cookie, a body, a token, an e-mail address or a file name. */
export function createLogger(level: string, destination?: DestinationStream): Logger {
  const options = { level, serializers: { err: describeError }, redact: ['req.headers', 'res.headers', '*.cookie', '*.password', '*.token', '*.email'] }
  return destination ? pino(options, destination) : pino(options)
}

/**
 * One line a request of the API: id, person, route, status, time. The line is put together from these and nothing else: a
 * logger that takes whole requests and leaves things out shows the session's cookie the day one name is forgotten.
 */
export const requestLog = (logger: Logger): RequestHandler => (req, res, next) => {
  const startedAt = performance.now()
  // Our own id, whatever the client sends: a line of the log must not be forged from outside.
  req.id = randomUUID()
  res.set('X-Request-Id', req.id)
  const isApi = req.path.startsWith('/api/') && req.path !== '/api/health'
  if (isApi) {
    res.once('close', () => {
      const line = {
        requestId: req.id, userId: req.session?.userId ?? null, method: req.method,
        // the pattern, not the address: no id or token of a path gets in
        route: req.route ? String(req.route.path) : 'none',
        status: res.statusCode, tookMs: Math.round(performance.now() - startedAt),
        ...(!res.writableFinished && { brokenOff: true }),
      }
      if (res.statusCode >= 500) logger.warn(line, 'request')
      else logger.info(line, 'request')
    })
  }
  next()
}
