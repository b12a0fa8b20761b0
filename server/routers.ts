import { type Router } from 'express'
import { accountRouter } from './account/accountRouter.ts'
import { type AppContext } from './context.ts'
import { changeRouter } from './changes/changeRouter.ts'
import { commentRouter } from './comments/commentRouter.ts'
import { finalCutRouter } from './finalCuts/finalCutRouter.ts'
import { observationRouter } from './observations/observationRouter.ts'
import { patternRouter } from './patterns/patternRouter.ts'
import { photographRouter } from './photographs/photographRouter.ts'
import { pieceRouter } from './pieces/pieceRouter.ts'
import { projectRouter } from './projects/projectRouter.ts'
import { sampleRouter } from './samples/sampleRouter.ts'
import { sizePlanRouter } from './sizePlans/sizePlanRouter.ts'
import { studioRouter } from './studios/studioRouter.ts'
import { wearerRouter } from './wearers/wearerRouter.ts'

/** Every router behind the session, one a noun; each registers its routes with `serve`. */
export const routers = (context: AppContext): Router[] => [
  accountRouter(context),
  studioRouter(context),
  wearerRouter(context),
  patternRouter(context),
  projectRouter(context),
  sizePlanRouter(context),
  pieceRouter(context),
  sampleRouter(context),
  photographRouter(context),
  observationRouter(context),
  changeRouter(context),
  finalCutRouter(context),
  commentRouter(context),
]
