import { Readable } from 'node:stream'
import { type PhotographStore } from '#server/storage/store.ts'

/** A store in memory, for tests that care for everything but the disk. */
export function memoryStore(): PhotographStore & { files: Map<string, Buffer> } {
  const files = new Map<string, Buffer>()
  const putAt = new Map<string, Date>()
  return {
    files,
    async put(key, bytes) {
      files.set(key, bytes)
      putAt.set(key, new Date())
    },
    async get(key) {
      const bytes = files.get(key)
      return bytes ? { stream: Readable.from([bytes]), bytes: bytes.length } : null
    },
    async has(key) { return files.has(key) },
    async remove(key) { files.delete(key) },
    async* list() {
      for (const key of files.keys()) yield { key, putAt: putAt.get(key)! }
    },
  }
}
