import { randomUUID } from 'node:crypto'
import { createReadStream } from 'node:fs'
import { type FileHandle, mkdir, open, readdir, rename, rm, stat } from 'node:fs/promises'
import { dirname, join, relative, resolve, sep } from 'node:path'
import { type PhotographStore } from './store.ts'

const keyShape = /^[a-z0-9][a-z0-9._-]*(\/[a-z0-9][a-z0-9._-]*)*$/
const half = '.part'

/**
 * A store in a folder of this machine. A file appears under its key only when it is whole and on the disk: it is written
 * beside it, synced and renamed, and then the folder is synced, so that the name survives a loss of power too.
 */
export function diskStore(folder: string): PhotographStore {
  const root = resolve(folder)
  const pathOf = (key: string) => {
    if (!keyShape.test(key)) throw new Error('A key of the photograph store has the wrong shape.')
    return join(root, ...key.split('/'))
  }
  return {
    async put(key, bytes) {
      const path = pathOf(key)
      await makeFolder(dirname(path))
      const part = `${path}.${randomUUID()}${half}`
      try {
        await withFile(part, 'wx', async (file) => {
          await file.writeFile(bytes)
          await file.sync()
        })
        await rename(part, path)
      } catch (error) {
        await rm(part, { force: true })
        throw error
      }
      await withFile(dirname(path), 'r', (file) => file.sync())
    },
    async get(key) {
      const path = pathOf(key)
      const found = await sizeOf(path)
      return found === null ? null : { stream: createReadStream(path), bytes: found }
    },
    async has(key) {
      return (await sizeOf(pathOf(key))) !== null
    },
    async remove(key) {
      await rm(pathOf(key), { force: true })
    },
    async* list() {
      for (const entry of await readdir(root, { recursive: true, withFileTypes: true })) {
        if (!entry.isFile()) continue
        const path = join(entry.parentPath, entry.name)
        const found = await stat(path).catch(() => null) // removed meanwhile
        if (found) yield { key: relative(root, path).split(sep).join('/'), putAt: found.mtime }
      }
    },
  }

  /** Every folder that is made is synced into the one above it. */
  async function makeFolder(path: string): Promise<void> {
    const first = await mkdir(path, { recursive: true, mode: 0o700 })
    if (first === undefined) return
    for (let made = path; made.length >= first.length; made = dirname(made)) await withFile(dirname(made), 'r', (file) => file.sync())
  }
}

async function sizeOf(path: string): Promise<number | null> {
  try {
    return (await stat(path)).size
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null
    throw error
  }
}

async function withFile<T>(path: string, flags: string, use: (file: FileHandle) => Promise<T>): Promise<T> {
  const file = await open(path, flags, 0o600)
  try {
    return await use(file)
  } finally {
    await file.close()
  }
}
