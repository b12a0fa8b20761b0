import { type View } from '#shared/fit/types.ts'

export type KeptPhotograph = { key: string; file: File; view: View }
/** Photographs not yet stored on the server, kept on the device over a reload. */
export type PendingPhotographs = {
  keep: (photograph: KeptPhotograph) => Promise<void>
  drop: (key: string) => Promise<void>
  all: () => Promise<KeptPhotograph[]>
}

const store = 'photographs'

/**
 * Kept in IndexedDB under one project and sample. Where the browser gives none (private windows), photographs live as long as the page:
 * an upload must never fail because it could not be kept.
 */
export function pendingPhotographs(projectId: string, number: number): PendingPhotographs {
  const shelf = `${projectId}/${number}`
  const run = async <T>(mode: IDBTransactionMode, work: (photographs: IDBObjectStore) => IDBRequest<T>): Promise<T | null> => {
    try {
      const db = await open()
      return await new Promise<T>((resolve, reject) => {
        const transaction = db.transaction(store, mode)
        const request = work(transaction.objectStore(store))
        transaction.oncomplete = () => { db.close(); resolve(request.result) }
        transaction.onerror = transaction.onabort = () => { db.close(); reject(transaction.error ?? new Error('The device could not keep this.')) }
      })
    } catch {
      return null
    }
  }
  return {
    keep: async (photograph) => { await run('readwrite', (photographs) => photographs.put({ ...photograph, shelf })) },
    drop: async (key) => { await run('readwrite', (photographs) => photographs.delete(key)) },
    all: async () => {
      const rows = await run('readonly', (photographs) => photographs.getAll() as IDBRequest<(KeptPhotograph & { shelf: string })[]>)
      return (rows ?? []).filter((row) => row.shelf === shelf).map(({ key, file, view }) => ({ key, file, view }))
    },
  }
}

function open(): Promise<IDBDatabase> {
  return new Promise((resolve, reject) => {
    const request = indexedDB.open('proofcloth', 1)
    request.onupgradeneeded = () => request.result.createObjectStore(store, { keyPath: 'key' })
    request.onsuccess = () => resolve(request.result)
    request.onerror = () => reject(request.error ?? new Error('The device keeps nothing.'))
  })
}
