import { type Db } from '#db/client.ts'
import { patterns } from '#db/schema/patterns.ts'
import { projects } from '#db/schema/projects.ts'

/** A project's row with a skirt pattern, put straight into the database. @returns both ids */
export async function makeProject(db: Db, { studioId, wearerId }: { studioId: string; wearerId: string }) {
  const [pattern] = await db.insert(patterns).values({ studioId, name: 'Panel skirt', garment: { kind: 'skirt' }, chart: [] }).returning()
  const [project] = await db.insert(projects).values({ studioId, wearerId, patternId: pattern!.id, name: 'Brown skirt' }).returning()
  return { projectId: project!.id, patternId: pattern!.id }
}
