import { createHash } from 'node:crypto'
import { type PhotographSize, photographSizes } from '#shared/contracts/photograph.ts'
import { type PhotographStore } from '../storage/store.ts'
import { type MadeSizes } from './makeSizes.ts'

const sizes = Object.keys(photographSizes) as PhotographSize[]

/** Where one size of a photograph lies: by its content, so that the same picture twice is one file and a file never changes. */
export const keyOf = (contentHash: string, size: PhotographSize): string => `photographs/${contentHash.slice(0, 2)}/${contentHash}-${size}.jpg`
/** The content hash a key names, or null for a key that is not a photograph's. */
export const hashOfKey = (key: string): string | null => /^photographs\/[0-9a-f]{2}\/([0-9a-f]{64})-[a-z]+\.jpg$/.exec(key)?.[1] ?? null

/** Puts the three sizes into the store. @returns the hash they lie under and their bytes together */
export async function storeSizes(storage: PhotographStore, { files }: MadeSizes): Promise<{ contentHash: string; bytes: number }> {
  const contentHash = createHash('sha256').update(files.full).digest('hex')
  for (const size of sizes) await storage.put(keyOf(contentHash, size), files[size])
  return { contentHash, bytes: sizes.reduce((sum, size) => sum + files[size].length, 0) }
}

export const hasAllSizes = async (storage: PhotographStore, contentHash: string): Promise<boolean> => (await Promise.all(sizes.map((size) => storage.has(keyOf(contentHash, size))))).every(Boolean)
