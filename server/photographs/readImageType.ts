import { fileTypeFromFile } from 'file-type'
import { photographLimits } from '#shared/contracts/photograph.ts'
import { DomainError } from '#shared/errors.ts'

const heic = new Set(['image/heic', 'image/heif', 'image/heic-sequence', 'image/heif-sequence'])

/**
 * What a file is by its content; its name and the sender's word do not count.
 * @returns whether it needs the HEIC decoder
 * @throws 'photograph.type' for anything but the photographs on the list
 */
export async function readImageType(path: string): Promise<{ heic: boolean }> {
  const type = await fileTypeFromFile(path)
  if (type && heic.has(type.mime)) return { heic: true }
  if (type && (photographLimits.types as readonly string[]).includes(type.mime)) return { heic: false }
  throw new DomainError('photograph.type', 'This is not a photograph we can read. Send a JPEG, PNG, WebP, AVIF or HEIC file.', { photograph: 'Send a JPEG, PNG, WebP, AVIF or HEIC file.' })
}
