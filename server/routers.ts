import { type Router } from 'express'
import { accountRouter } from './account/accountRouter.ts'
import { type AppContext } from './context.ts'
import { patternRouter } from './patterns/patternRouter.ts'
import { studioRouter } from './studios/studioRouter.ts'
import { wearerRouter } from './wearers/wearerRouter.ts'

/** Every router behind the session, one a noun; each registers its routes with `serve`. */
export const routers = (context: AppContext): Router[] => [
  accountRouter(context),
  studioRouter(context),
  wearerRouter(context),
  patternRouter(context),
]
