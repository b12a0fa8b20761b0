import { type z } from 'zod'
import { DomainError } from '#shared/errors.ts'

/**
 * Parses params, query or body by its contract.
 * @returns undefined when the contract has no such part
 * @throws DomainError 'request.invalid' with details: field → sentence
 */
export function parsePart(schema: z.ZodType | undefined, value: unknown, part: 'address' | 'query' | 'request'): unknown {
  if (!schema) return undefined
  const read = schema.safeParse(value)
  if (read.success) return read.data
  const details: Record<string, string> = {}
  for (const issue of read.error.issues) {
    const field = issue.code === 'unrecognized_keys' ? [...issue.path, issue.keys[0]].join('.') : issue.path.join('.')
    details[field || part] ??= issue.code === 'unrecognized_keys' ? 'This field is not known here.' : issue.message
  }
  const fields = Object.keys(details)
  throw new DomainError('request.invalid', `Check ${fields.length === 1 ? 'this field' : 'these fields'} of the ${part}: ${fields.join(', ')}.`, details)
}
