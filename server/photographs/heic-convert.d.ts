declare module 'heic-convert' {
  /** Decodes a HEIC file and encodes it anew. */
  export default function convert(options: { buffer: ArrayBufferLike | Uint8Array; format: 'JPEG' | 'PNG'; quality?: number }): Promise<ArrayBuffer>
}
