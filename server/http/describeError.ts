import { DatabaseError } from 'pg'
import { DrizzleQueryError } from 'drizzle-orm/errors'

/**
 * An error as the log keeps it: kind, message, place and causes. What was typed stays out: a failed query names its SQL but
 * not the values, and PostgreSQL's own sentence, which quotes values, is told by its code.
 */
export function describeError(thrown: unknown, depth = 0): object {
  if (!(thrown instanceof Error)) return { type: typeof thrown }
  const frames = thrown.stack?.split('\n').filter((line) => /^\s+at /.test(line)).join('\n')
  return {
    type: thrown.name, message: messageOf(thrown),
    ...('code' in thrown && { code: thrown.code }),
    ...(thrown instanceof DatabaseError && { table: thrown.table, constraint: thrown.constraint, routine: thrown.routine }),
    stack: frames,
    ...(thrown.cause !== undefined && depth < 4 && { cause: describeError(thrown.cause, depth + 1) }),
  }
}

function messageOf(error: Error): string {
  if (error instanceof DrizzleQueryError) return `Failed query: ${error.query}`
  if (error instanceof DatabaseError) return `PostgreSQL answered ${error.code}`
  return error.message
}
