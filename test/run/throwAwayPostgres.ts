import { chmodSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { type LocalPostgres, startLocalPostgres } from '#db/local/localPostgres.ts'

export type ThrowAwayPostgres = LocalPostgres & { folder: string }

/** A PostgreSQL that waits for no disk, in a folder of its own that goes with it. */
export async function throwAwayPostgres(): Promise<ThrowAwayPostgres> {
  const folder = mkdtempSync(join(tmpdir(), 'proofcloth-test-'))
  // As root the server is another user: let it through to its data, and see nothing on the way.
  chmodSync(folder, 0o711)
  const remove = (place = folder) => [folder, place].forEach((path) => rmSync(path, { recursive: true, force: true }))
  try {
    const postgres = await startLocalPostgres(join(folder, 'postgres'), { throwAway: true })
    return { ...postgres, folder, stop: async () => { await postgres.stop(); remove(postgres.place) } }
  } catch (error) {
    remove()
    throw error
  }
}
