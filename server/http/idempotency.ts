import { createHash, randomUUID } from 'node:crypto'
import { type Request } from 'express'
import { type Queryable } from '#db/client.ts'
import { requestKeyQueries } from '#db/queries/requestKeys.ts'
import { type Route } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { type SignedIn } from '../access/checkAccess.ts'
import { type AppContext } from '../context.ts'

type Run = (db: Queryable, createdId: string) => Promise<unknown>

/**
 * Runs a creating request once per person and `Idempotency-Key`; without a key or on other routes it just runs.
 * The key's row and whatever the handler writes are one transaction: both are there or neither, after a crash too, and a
 * repeat that arrives meanwhile waits for the first at the key's row. An upload takes too long to hold a transaction open:
 * it relies on `createdId`, which a repeat finds again.
 * @throws DomainError 'state.wrong' when the key was used for another request, 'request.invalid' when it is no key
 */
export async function runOnce(context: AppContext, route: Route, req: Request, user: SignedIn | null, body: unknown, run: Run): Promise<unknown> {
  const key = route.idempotent && user ? readKey(req) : null
  if (!key || !user) return run(context.db, randomUUID())

  const request = `${route.method} ${req.path} ${digest(JSON.stringify(body ?? null)).toString('base64url')}`
  const createdId = idFrom(`${user.id} ${key}`)
  if (route.upload) {
    const keys = requestKeyQueries(context.db)
    if (!(await keys.claim(user.id, key, request))) checkSame(await keys.find(user.id, key), request)
    return run(context.db, createdId)
  }
  return context.db.transaction(async (tx) => {
    const keys = requestKeyQueries(tx)
    if (!(await keys.claim(user.id, key, request))) return checkSame(await keys.find(user.id, key), request)?.answer
    const answer = await run(tx, createdId)
    await keys.keepAnswer(user.id, key, route.status ?? 200, answer)
    return answer
  })
}

function readKey(req: Request): string | null {
  const key = req.get('idempotency-key')
  if (key === undefined) return null
  if (!/^[\w-]{8,100}$/.test(key)) {
    throw new DomainError('request.invalid', 'The Idempotency-Key header must be 8 to 100 letters, digits, hyphens or underscores.')
  }
  return key
}

function checkSame<Row extends { request: string }>(row: Row | null, request: string): Row | null {
  if (row && row.request !== request) {
    throw new DomainError('state.wrong', 'This request key was already used for something else. Send the request with a new key.')
  }
  return row
}

const digest = (text: string) => createHash('sha256').update(text).digest()

/** A UUID (version 8, RFC 9562 §5.8) that is the same for the same text. */
function idFrom(text: string): string {
  const bytes = digest(text).subarray(0, 16)
  bytes[6] = (bytes[6]! & 0x0f) | 0x80
  bytes[8] = (bytes[8]! & 0x3f) | 0x80
  return bytes.toString('hex').replace(/^(.{8})(.{4})(.{4})(.{4})(.{12})$/, '$1-$2-$3-$4-$5')
}
