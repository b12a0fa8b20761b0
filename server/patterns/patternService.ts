import { type Queryable } from '#db/client.ts'
import { isForeignKeyViolation } from '#db/isForeignKeyViolation.ts'
import { auditQueries } from '#db/queries/auditEntries.ts'
import { type PatternWithCount, patternQueries } from '#db/queries/patterns.ts'
import { type Pattern, type createPattern, type updatePattern } from '#shared/contracts/pattern.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { staleVersion } from '../staleVersion.ts'

export type PatternService = ReturnType<typeof patternService>

export const patternService = ({ db }: { db: Queryable }) => ({
  async list(studioId: string): Promise<Pattern[]> {
    return (await patternQueries(db).list(studioId)).map(toPattern)
  },

  async read(studioId: string, id: string): Promise<Pattern> {
    const row = await patternQueries(db).find(studioId, id)
    if (!row) throw new DomainError('not-found', 'There is no such pattern in this studio.')
    return toPattern(row)
  },

  async create(studioId: string, input: RouteBody<typeof createPattern>): Promise<Pattern> {
    checkChart(input.chart)
    const row = await patternQueries(db).insert({ studioId, ...input })
    return toPattern({ ...row, projectCount: 0 })
  },

  /** @throws 'version.stale' with the pattern as it is now */
  async update(studioId: string, id: string, { version, ...input }: RouteBody<typeof updatePattern>): Promise<Pattern> {
    checkChart(input.chart)
    const updated = await patternQueries(db).update(studioId, id, version, input)
    const current = await this.read(studioId, id)
    if (!updated) throw staleVersion(current)
    return current
  },

  /** @throws 'state.wrong' while a project uses it */
  async remove(studioId: string, byUserId: string, id: string): Promise<void> {
    try {
      await db.transaction(async (tx) => {
        if (!(await patternQueries(tx).remove(studioId, id))) throw new DomainError('not-found', 'There is no such pattern in this studio.')
        await auditQueries(tx).add('pattern.removed', { userId: byUserId, studioId }, { pattern: id })
      })
    } catch (thrown) {
      if (!isForeignKeyViolation(thrown)) throw thrown
      throw new DomainError('state.wrong', 'A project uses this pattern, so it stays. Remove the project first.', {}, { cause: thrown })
    }
  },
})

/** Sizes are told apart by their label alone: on the plan, on the tracing and on the cutting sheet. */
function checkChart(chart: Pattern['chart']): void {
  const labels = chart.map(({ label }) => label.toLowerCase())
  const twice = chart.find(({ label }, i) => labels.indexOf(label.toLowerCase()) !== i)
  if (twice) throw new DomainError('request.invalid', `Two sizes are called ${twice.label}. Give each its own label.`, { chart: `Two sizes are called ${twice.label}.` })
}

/** A pattern as it is sent, from its row. */
export const toPattern = ({ updatedAt, garment, ...row }: PatternWithCount): Pattern => ({
  // the same shape: only the rules' own type is read-only
  ...row, garment: garment as Pattern['garment'], updatedAt: updatedAt.toISOString(),
})
