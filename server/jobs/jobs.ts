import { type AppContext } from '../context.ts'
import { sweepUploads } from '../http/uploadFolder.ts'
import { sweepPhotographs } from '../photographs/sweepPhotographs.ts'
import { type Job } from './scheduler.ts'
import { sweepExpired } from './sweepExpired.ts'

const hourMs = 3600 * 1000

/** What the server does beside answering. */
export const jobs = (context: AppContext): Job[] => [
  { name: 'sweep what has expired', everyMs: hourMs, run: () => sweepExpired(context.db) },
  { name: 'sweep photographs', everyMs: hourMs, run: () => sweepPhotographs(context.db, context.storage) },
  { name: 'sweep uploads left behind', everyMs: hourMs, run: () => sweepUploads() },
]
