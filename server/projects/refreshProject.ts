import { type Queryable } from '#db/client.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { readProjectState } from '#db/queries/projectState.ts'
import { isOpen } from './projectState.ts'

/** Brings what the shelf lists a project by up to date; called in the transaction of every change to what hangs on it. */
export async function refreshProject(tx: Queryable, projectId: string): Promise<void> {
  const projects = projectQueries(tx)
  const [project, plan, state] = [await projects.find(projectId), await projects.sizePlan(projectId), await readProjectState(tx, projectId)]
  if (!project) return
  const newest = state.samples.at(-1)
  const settledStage = project.stage === 'resting' || project.stage === 'cleared' || project.stage === 'cut'
  await projects.keep(projectId, {
    stage: settledStage ? project.stage : plan?.keptAt || newest ? 'sample' : 'size',
    sampleNumber: newest?.number ?? null, sampleState: newest?.state ?? null,
    openCount: state.observations.filter(isOpen).length,
  })
}
