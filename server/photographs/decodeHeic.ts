import { existsSync } from 'node:fs'
import { Worker } from 'node:worker_threads'
import { DomainError } from '#shared/errors.ts'

const limitMs = 60_000
const unreadable = (cause?: unknown) => new DomainError('photograph.unreadable', 'This HEIC photograph could not be decoded. Save it as JPEG on the phone (camera settings, most compatible) and send it again.', {}, { cause })

/** Beside the bundled server lies the bundled worker; from source it is the TypeScript file. */
function workerFile(): URL {
  const bundled = new URL('./heicWorker.js', import.meta.url)
  return existsSync(bundled) ? bundled : new URL('./heicWorker.ts', import.meta.url)
}

/**
 * Decodes a HEIC or HEIF file to JPEG bytes, upright as its own header says.
 * @throws 'photograph.unreadable' when it cannot be decoded, or takes longer than a minute
 */
export function decodeHeic(path: string): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const worker = new Worker(workerFile(), { workerData: { path }, resourceLimits: { maxOldGenerationSizeMb: 1024 } })
    const timer = setTimeout(() => { reject(unreadable()); void worker.terminate() }, limitMs)
    worker.once('message', (bytes: Uint8Array) => { resolve(Buffer.from(bytes)); void worker.terminate() })
    worker.once('error', (error) => reject(unreadable(error)))
    worker.once('exit', () => { clearTimeout(timer); reject(unreadable()) })
  })
}
