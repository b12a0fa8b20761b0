import { type Db } from '#db/client.ts'
import { photographQueries } from '#db/queries/photographs.ts'
import { type PhotographStore } from '../storage/store.ts'
import { hashOfKey } from './storedSizes.ts'

const dayMs = 24 * 3600 * 1000
const batch = 200

/**
 * Brings rows and files back together: drops rows whose upload never finished and those removed a day ago, then files no row names.
 * A file younger than a day stays: its row may be about to be written.
 */
export async function sweepPhotographs(db: Db, storage: PhotographStore, now = new Date()): Promise<{ rows: number; files: number }> {
  const before = new Date(now.getTime() - dayMs)
  const rows = await photographQueries(db).dropForgotten(before)
  let files = 0
  let keys: { key: string; hash: string }[] = []
  const drop = async () => {
    const inUse = await photographQueries(db).hashesInUse([...new Set(keys.map(({ hash }) => hash))])
    for (const { key } of keys.filter(({ hash }) => !inUse.has(hash))) {
      await storage.remove(key)
      files++
    }
    keys = []
  }
  for await (const { key, putAt } of storage.list()) {
    const hash = hashOfKey(key)
    if (!hash || putAt >= before) continue
    keys.push({ key, hash })
    if (keys.length >= batch) await drop()
  }
  await drop()
  return { rows, files }
}
