import { rm } from 'node:fs/promises'
import express, { type Request, type RequestHandler, type Response } from 'express'
import multer from 'multer'
import { photographLimits } from '#shared/contracts/photograph.ts'
import { type Route } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { uploadFolder } from './uploadFolder.ts'

/** An uploaded file in a temporary place. Its name and type are what the sender says: trust neither. */
export type ReceivedFile = { path: string; bytes: number }
type Received = { body: unknown; file: ReceivedFile | null; remove: () => Promise<void> }

const jsonBytes = 1024 * 1024
const readJson = express.json({ limit: jsonBytes, type: 'application/json', strict: true })

// On disk and not in memory: many uploads at once must not add up to many times 25 MB of heap.
const readUpload = multer({
  storage: multer.diskStorage({ destination: (_req, _file, done) => { uploadFolder().then((folder) => done(null, folder), (error: Error) => done(error, '')) } }),
  limits: { fileSize: photographLimits.bytes, files: 1, fields: 12, fieldNameSize: 60, fieldSize: 8 * 1024, parts: 14, headerPairs: 40 },
}).single('photograph')

/**
 * Reads the body a route expects, and only in the media type it expects.
 * @throws DomainError 'request.invalid' for another media type, 'photograph.missing' for an upload without a file;
 *   errors of the parsers as they are: the error handler knows them
 */
export async function receiveBody(route: Route, req: Request, res: Response): Promise<Received> {
  const nothing: Received = { body: undefined, file: null, remove: async () => {} }
  if (route.upload) {
    expectType(req, 'multipart/form-data')
    await run(readUpload, req, res)
    const { file } = req
    const remove = async () => { if (file) await rm(file.path, { force: true }) }
    if (!file) throw new DomainError('photograph.missing', 'There is no photograph in this request. Choose one and send it again.', { photograph: 'Choose a photograph.' })
    // multer makes a body without a prototype; zod takes it either way
    return { body: { ...req.body }, file: { path: file.path, bytes: file.size }, remove }
  }
  if (!route.body) return nothing
  expectType(req, 'application/json')
  await run(readJson, req, res)
  return { ...nothing, body: req.body ?? {} }
}

function expectType(req: Request, type: string): void {
  if (req.is(type)) return
  throw new DomainError('request.invalid', `Send this request as ${type}.`)
}

const run = (middleware: RequestHandler, req: Request, res: Response) => new Promise<void>((resolve, reject) => {
  middleware(req, res, (error?: unknown) => (error ? reject(error) : resolve()))
})
