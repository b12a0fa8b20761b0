import { z } from 'zod'

export const id = z.uuid()
/** Counts up with every change; sent back with an edit so that two people never silently overwrite each other. */
export const version = z.int().min(1)
export const isoDate = z.iso.date()
export const isoDateTime = z.iso.datetime({ offset: true })

/** One line of text a person typed: NFC, no control characters, trimmed. */
export const line = (max: number) => z.string().normalize('NFC').trim().min(1).max(max).regex(/^\P{Cc}*$/u, 'Leave out control characters.')
/** Text of several lines; may be empty. */
export const prose = (max: number) => z.string().normalize('NFC').trim().max(max).regex(/^[^\u0000]*$/, 'Leave out NUL characters.')

/** A length on the body or on paper, in millimetres. */
export const lengthMm = z.number().min(0).max(4000)
/** An amount of a change, in millimetres; + adds to the paper. */
export const amountMm = z.number().min(-1000).max(1000)
/** Measurement code → mm. */
export const body = z.record(z.string().regex(/^[a-z][a-z0-9-]{1,40}$/), lengthMm)

export const units = z.enum(['cm', 'inch'])
export type Unit = z.infer<typeof units>

export const person = z.object({ id, name: z.string() })

export const apiError = z.object({
  error: z.object({ code: z.string(), message: z.string(), details: z.record(z.string(), z.unknown()), requestId: z.string().optional() }),
})

export const studioParams = z.strictObject({ studioId: id })
export const projectParams = z.strictObject({ projectId: id })
export const sampleNumber = z.coerce.number().int().min(1).max(99)
export const sampleParams = z.strictObject({ projectId: id, number: sampleNumber })
