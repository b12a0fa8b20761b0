import { randomUUID } from 'node:crypto'
import { type IncomingMessage, type ServerResponse } from 'node:http'
import { type Request } from 'express'
import { type DestinationStream, type Logger, pino } from 'pino'
import { pinoHttp } from 'pino-http'
import { describeError } from './describeError.ts'

/** The process log: never a cookie, a body, a token, an e-mail address or a file name. */
export function createLogger(level: string, destination?: DestinationStream): Logger {
  const options = { level, serializers: { err: describeError }, redact: ['req.headers', 'res.headers', '*.cookie', '*.password', '*.token', '*.email'] }
  return destination ? pino(options, destination) : pino(options)
}

/** One line a request: id, person, route, status, time. A path is named by its route, so no id or token of an address gets in. */
export const requestLog = (logger: Logger) => pinoHttp({
  logger,
  // Our own id, whatever the client sends: a line of the log must not be forged from outside.
  genReqId: (_req: IncomingMessage, res: ServerResponse) => {
    const id = randomUUID()
    res.setHeader('X-Request-Id', id)
    return id
  },
  serializers: {
    req: (req: { id: string; method: string; raw: Request }) => ({ id: req.id, method: req.method }),
    res: (res: { statusCode: number }) => ({ status: res.statusCode }),
    err: describeError,
  },
  // Not customProps: those are read at the start as well, before the route is known, and would stand twice in the line.
  customSuccessObject: named,
  customErrorObject: (req, res, _error, line) => named(req, res, line),
  customLogLevel: (_req: IncomingMessage, res: ServerResponse) => (res.statusCode >= 500 ? 'warn' : 'info'),
  autoLogging: { ignore: (req: IncomingMessage) => !req.url?.startsWith('/api/') || req.url === '/api/health' },
})

function named(req: IncomingMessage, _res: ServerResponse, line: object): object {
  const { route, session } = req as Request
  return { ...line, route: route ? String(route.path) : 'none', userId: session?.userId ?? null }
}
