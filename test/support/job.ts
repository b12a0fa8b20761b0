import sharp from 'sharp'
import { type Person } from './testApp.ts'

/** A JPEG of one colour with a white corner at the top left as the camera holds it, so that a turned picture can be told. */
export async function photograph({ width = 900, height = 1200, colour = '#8899aa', orientation, place = false }: { width?: number; height?: number; colour?: string; orientation?: number; place?: boolean } = {}): Promise<Buffer> {
  const corner = await sharp({ create: { width: Math.round(width / 4), height: Math.round(height / 4), channels: 3, background: '#ffffff' } }).png().toBuffer()
  const picture = sharp({ create: { width, height, channels: 3, background: colour } }).composite([{ input: corner, left: 0, top: 0 }]).jpeg({ quality: 90 })
  const exif = {
    IFD0: { Make: 'Test camera', ...(orientation ? { Orientation: String(orientation) } : {}) },
    ...(place ? { IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '51/1 30/1 0/1', GPSLongitudeRef: 'W', GPSLongitude: '0/1 7/1 0/1' } } : {}),
  }
  // The EXIF alone does not set it: the library writes the orientation it holds itself over it.
  return (orientation ? picture.withExif(exif).withMetadata({ orientation }) : picture.withExif(exif)).toBuffer()
}

/** A size chart of three sizes, in mm. */
export const skirtChart = [
  { label: '12', lineStyle: 'solid', body: { waist: 700, hip: 960 } },
  { label: '14', lineStyle: 'long-dash', body: { waist: 740, hip: 1000 } },
  { label: '16', lineStyle: 'dotted', body: { waist: 780, hip: 1040 } },
]

/** A fitted skirt for a measured wearer, hung on the rail. @returns the project's id */
export async function hangSkirt(person: Person, { studioId, wearerId }: { studioId: string; wearerId: string }): Promise<string> {
  const base = `/api/studios/${studioId}`
  await person.post(`${base}/wearers/${wearerId}/measurement-sets`).send({ takenOn: new Date().toISOString().slice(0, 10), takenBy: 'Mara', measurements: [{ code: 'waist', readingsMm: [742, 738] }, { code: 'hip', readingsMm: [1038, 1042] }] }).expect(201)
  const { body: pattern } = await person.post(`${base}/patterns`).send({ name: 'Panel skirt', view: 'A', garment: { kind: 'skirt', waist: 'fitted', features: ['darts', 'waistband', 'straight'] }, chart: skirtChart }).expect(201)
  const { body: project } = await person.post(`${base}/projects`).send({ name: 'Brown skirt', wearerId, patternId: pattern.id }).expect(201)
  return project.id as string
}

/** Keeps a size and traces every piece with its marks, so that the first sample can be sewn. */
export async function sizeAndTrace(person: Person, projectId: string): Promise<void> {
  const base = `/api/projects/${projectId}`
  const { body: plan } = await person.get(`${base}/size-plan`).expect(200)
  await person.put(`${base}/size-plan`).send({ choices: { waist: '14', hip: '16' }, reason: 'Measured at both', keep: true, version: plan.version }).expect(200)
  const { body: tracing } = await person.post(`${base}/pieces/from-template`).expect(201)
  for (const piece of tracing.pieces) await completePiece(person, projectId, piece)
  await person.post(`${base}/pieces/last-look`).expect(200)
}

/** Ticks everything a piece still lacks. */
export async function completePiece(person: Person, projectId: string, piece: { id: string; version: number; missing: string[]; notchCount: number | null; dartCount: number | null }): Promise<void> {
  const counts = { ...(piece.notchCount === null && { notchCount: 2 }), ...(piece.dartCount === null && { dartCount: 1 }) }
  const { body: counted } = await person.patch(`/api/projects/${projectId}/pieces/${piece.id}`).send({ ...counts, version: piece.version }).expect(200)
  await person.patch(`/api/projects/${projectId}/pieces/${piece.id}`).send({ marks: Object.fromEntries(counted.missing.map((mark: string) => [mark, 'marked'])), hangs: 'hook 3', version: counted.version }).expect(200)
}

/** An observation as it is sent; give what matters. */
export const seen = (given: object) => ({
  photographId: null, mark: null, sign: 'tight', zone: 'hip', view: 'front', side: 'both', direction: null, towards: null, line: null, severity: 2, amount: null, note: '', ...given,
})
