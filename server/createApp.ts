import compression from 'compression'
import express, { type Express } from 'express'
import { type Route } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { type AppContext } from './context.ts'
import { client } from './http/client.ts'
import { errorHandler } from './http/errorHandler.ts'
import { requestLog } from './http/logger.ts'
import { originCheck } from './http/originCheck.ts'
import { securityHeaders } from './http/securityHeaders.ts'
import { routesOf } from './http/serve.ts'
import { sessions } from './http/sessions.ts'
import { routers } from './routers.ts'
import { serviceRouter } from './service/serviceRouter.ts'

const methods = new Set(['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE'])

/** Builds the server: headers, log, origin check, sessions, the routes of the contracts, the client. Listens to nothing itself. */
export function createApp(context: AppContext): Express {
  const app = express()
  app.disable('x-powered-by')
  // Answers of the API are never kept, so a digest of each would be work for nothing; files have their own.
  app.disable('etag')
  app.set('trust proxy', context.settings.trustProxy)
  app.set('query parser', 'simple')

  const withSession = routers(context)
  const routes: Route[] = []
  const service = serviceRouter(context, () => routes)
  routes.push(...[service, ...withSession].flatMap(routesOf))
  app.locals.routes = routes

  app.use(requestLog(context.logger), securityHeaders(context.settings), compression())
  app.use('/api', (req, res, next) => {
    res.set('Cache-Control', 'no-store')
    // Express would answer OPTIONS by itself and so tell which addresses exist.
    next(methods.has(req.method) ? undefined : notFound())
  }, originCheck(context.settings))
  app.use(service)
  app.use('/api', ...sessions(context))
  for (const router of withSession) app.use(router)
  app.use('/api', () => { throw notFound() })
  app.use(client(context.settings.clientFolder))
  app.use(() => { throw notFound() })
  app.use(errorHandler(context.logger))
  return app
}

const notFound = () => new DomainError('not-found', 'There is nothing at this address.')
