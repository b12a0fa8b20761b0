import { type Queryable } from '#db/client.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type FinalCut } from '#shared/contracts/finalCut.ts'
import { type Piece } from '#shared/contracts/piece.ts'
import { type Role } from '#shared/contracts/permissions.ts'
import { type Project } from '#shared/contracts/project.ts'
import { pieceService } from '../pieces/pieceService.ts'
import { projectService } from '../projects/projectService.ts'
import { finalCutService } from './finalCutService.ts'

export type CuttingSheetFacts = { project: Project; pieces: readonly Piece[]; finalCut: FinalCut; madeOn: Date }

/** Everything that stands on the cutting sheet. */
export async function cuttingSheetFacts(db: Queryable, project: ProjectRow, role: Role): Promise<CuttingSheetFacts> {
  return {
    project: await projectService({ db }).read(project.id, role),
    pieces: (await pieceService({ db }).list(project)).pieces,
    finalCut: await finalCutService({ db }).read(project),
    madeOn: new Date(),
  }
}
