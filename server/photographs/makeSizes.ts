import sharp from 'sharp'
import { type PhotographSize, photographLimits, photographSizes } from '#shared/contracts/photograph.ts'
import { DomainError } from '#shared/errors.ts'

export type MadeSizes = { files: Record<PhotographSize, Buffer>; width: number; height: number }

const jpeg = { quality: 82, chromaSubsampling: '4:2:0' } as const
const limitSeconds = 30
// The operating system's cache is enough; sharp's own would only keep other people's photographs in memory.
sharp.cache(false)

/**
 * Makes the three sizes from one decoding: turned upright by EXIF, in sRGB, first frame only, and without any metadata, so that
 * neither place nor device travels on.
 * @throws 'photograph.too-many-pixels' from the header alone, before anything is decoded; 'photograph.unreadable' for what is broken
 */
export async function makeSizes(source: string | Buffer): Promise<MadeSizes> {
  await checkHeader(source)
  try {
    const upright = sharp(source, { limitInputPixels: photographLimits.pixels, failOn: 'error', pages: 1, sequentialRead: true })
      .timeout({ seconds: limitSeconds }).autoOrient().toColourspace('srgb')
      .resize(photographSizes.full, photographSizes.full, { fit: 'inside', withoutEnlargement: true }).flatten({ background: '#ffffff' })
    // The largest size once as raw pixels: the smaller ones are made from it and the file is decoded a single time.
    const { data, info } = await upright.raw().toBuffer({ resolveWithObject: true })
    const raw = { raw: { width: info.width, height: info.height, channels: info.channels } }
    const inside = (edge: number) => sharp(data, raw).resize(edge, edge, { fit: 'inside', withoutEnlargement: true }).jpeg(jpeg).toBuffer()
    const [full, screen, thumb] = await Promise.all([sharp(data, raw).jpeg(jpeg).toBuffer(), inside(photographSizes.screen), inside(photographSizes.thumb)])
    return { files: { full, screen, thumb }, width: info.width, height: info.height }
  } catch (cause) {
    throw new DomainError('photograph.unreadable', 'This photograph is broken or cut short. Take it from the camera again and send that.', { photograph: 'Send the file once more.' }, { cause })
  }
}

async function checkHeader(source: string | Buffer): Promise<void> {
  let size: { width?: number; height?: number }
  try {
    size = await sharp(source, { limitInputPixels: false }).metadata()
  } catch (cause) {
    throw new DomainError('photograph.unreadable', 'This photograph is broken or cut short. Take it from the camera again and send that.', {}, { cause })
  }
  const pixels = (size.width ?? 0) * (size.height ?? 0)
  if (pixels > photographLimits.pixels) {
    throw new DomainError('photograph.too-many-pixels', `This photograph has ${Math.round(pixels / 1e6)} million pixels; at most ${photographLimits.pixels / 1e6} million can be read. Save it smaller and send that.`)
  }
}
