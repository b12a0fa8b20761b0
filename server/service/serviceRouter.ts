import { Router } from 'express'
import { sql } from 'drizzle-orm'
import { health, openApi as openApiRoute, ready } from '#shared/contracts/service.ts'
import { type Route } from '#shared/contracts/route.ts'
import { type AppContext } from '../context.ts'
import { openApi } from '../http/openApi.ts'
import { serve } from '../http/serve.ts'

/** Health, readiness and the description of the API; needs no session, so it answers while the database is away. */
export function serviceRouter(context: AppContext, routes: () => readonly Route[]): Router {
  const router = Router()
  let description: Record<string, unknown> | null = null
  serve(router, context, health, () => ({ status: 'ok' as const }))
  serve(router, context, ready, async () => {
    await context.db.execute(sql`select 1`)
    // Asking for a file that is not there is answered by a store that works.
    await context.storage.has('readiness')
    return { status: 'ready' as const, database: 'ok' as const, storage: 'ok' as const }
  })
  serve(router, context, openApiRoute, () => (description ??= openApi(routes())))
  return router
}
