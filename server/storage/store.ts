import { type Readable } from 'node:stream'

/** Where the files of photographs lie. Keys are made by the server alone: content hash and size, never a name a person typed. */
export interface PhotographStore {
  /** Keeps the bytes under the key; when it resolves they survive a loss of power. Putting the same key again changes nothing. */
  put(key: string, bytes: Buffer): Promise<void>
  /** The file as a stream with its size, or null when there is none. */
  get(key: string): Promise<{ stream: Readable; bytes: number } | null>
  has(key: string): Promise<boolean>
  /** Removing what is not there is no error. */
  remove(key: string): Promise<void>
  /** Every key in the store with the time it was put, for the sweep. */
  list(): AsyncIterable<{ key: string; putAt: Date }>
}
