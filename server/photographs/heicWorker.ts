import { readFile } from 'node:fs/promises'
import { parentPort, workerData } from 'node:worker_threads'
import convert from 'heic-convert'

// In a thread of its own: the decoder keeps a core busy for seconds, and a broken file must not hold up the server.
const { path } = workerData as { path: string }
const jpeg = await convert({ buffer: await readFile(path), format: 'JPEG', quality: 0.95 })
parentPort!.postMessage(new Uint8Array(jpeg))
