import { bodyColumn, type SizeChart } from '../../sizes/sizeChart.ts'
import { type Body, type Garment, type GarmentFeature, type GarmentKind, type PieceRole } from '../types.ts'
import { type PlanInput } from './types.ts'

export const hasFeature = (garment: Garment, feature: GarmentFeature): boolean => garment.features?.includes(feature) ?? false
export const isUpper = (kind: GarmentKind): boolean => kind !== 'skirt' && kind !== 'trousers'
export const isKnit = ({ garment }: PlanInput): boolean => hasFeature(garment, 'knit')

/** Bust or chest: the one the chart is drawn up by, and the body has, where there is a choice. */
export function upperCode(body: Body, chart: SizeChart): 'bust' | 'chest' {
  const has = (code: string) => bodyColumn(chart, code).length > 0
  if (has('bust') && has('chest')) return body.bust || !body.chest ? 'bust' : 'chest'
  return has('chest') ? 'chest' : 'bust'
}

/** The levels one cutting line runs through, from the top; a size may change between two of them. */
export function chainOf({ body, chart, garment }: PlanInput): string[] {
  if (garment.kind === 'skirt') return ['waist', 'abdomen', 'hip']
  if (garment.kind === 'trousers') return ['waist', 'abdomen', 'hip', 'thigh']
  return [upperCode(body, chart), 'waist', 'abdomen', 'hip']
}
/** Places that keep the size of the piece they belong to: nothing is blended inside an armhole or a neckline. */
export function followersOf({ garment }: PlanInput): string[] {
  if (garment.kind === 'skirt') return []
  if (garment.kind === 'trousers') return ['knee', 'calf', 'ankle']
  return ['neck', 'back-width', ...(garment.sleeves && garment.sleeves !== 'none' ? ['upper-arm', 'wrist'] : [])]
}
/** Lengths changed at a lengthen or shorten line before tracing, each with the zone whose size it is compared with. */
export function lengthsOf({ body, chart, garment }: PlanInput): { code: string; zone: string }[] {
  const upper = upperCode(body, chart)
  if (garment.kind === 'skirt') return [{ code: 'waist-to-hip', zone: 'hip' }, { code: 'waist-to-knee', zone: 'hip' }]
  if (garment.kind === 'trousers') return ['crotch-depth', 'waist-to-hip', 'inside-leg', 'outside-leg'].map((code) => ({ code, zone: 'hip' }))
  return ['back-waist-length', 'front-waist-length', ...(garment.kind === 'dress' ? ['waist-to-hip'] : []), ...(garment.sleeves && garment.sleeves !== 'none' ? ['arm-length'] : [])].map((code) => ({ code, zone: upper }))
}

/** Words for a level inside a sentence. */
export const levelWords: Readonly<Record<string, string>> = {
  bust: 'bust', chest: 'chest', 'high-bust': 'high bust', waist: 'waist', abdomen: 'high hip', hip: 'hip', thigh: 'thigh', knee: 'knee', calf: 'calf', ankle: 'ankle', neck: 'neck', 'back-width': 'across back', 'upper-arm': 'upper arm', wrist: 'wrist', height: 'height',
}
export const levelWord = (code: string): string => levelWords[code] ?? code.replaceAll('-', ' ')

const bodicePieces: readonly PieceRole[] = ['bodice-front', 'bodice-back', 'side-front', 'side-back']
const waistPieces: readonly PieceRole[] = ['waistband', 'casing', 'belt', 'fly']
const topPieces: readonly PieceRole[] = ['yoke', 'collar', 'collar-stand', 'neck-facing', 'front-facing', 'armhole-facing']
const sleevePieces: readonly PieceRole[] = ['sleeve', 'under-sleeve', 'cuff']

/** Which levels decide the size of a piece, from the top. */
export function pieceLevels(input: PlanInput): { roles: readonly PieceRole[]; levels: readonly string[] }[] {
  const { garment } = input
  const chain = chainOf(input)
  const top = chain[0]!
  const rows: { roles: readonly PieceRole[]; levels: readonly string[] }[] = []
  const hipPieces: readonly PieceRole[] = ['pocket', 'lining', 'tier']
  if (garment.kind === 'trousers') rows.push({ roles: ['trouser-front', 'trouser-back'], levels: chain }, { roles: waistPieces, levels: ['waist'] })
  else if (garment.kind === 'skirt') rows.push({ roles: ['skirt-front', 'skirt-back'], levels: chain }, { roles: waistPieces, levels: ['waist'] }, { roles: ['yoke'], levels: ['waist', 'abdomen', 'hip'] })
  else {
    const cutAtWaist = hasFeature(garment, 'waist-seam')
    rows.push({ roles: bodicePieces, levels: cutAtWaist ? [top, 'waist'] : chain }, { roles: topPieces, levels: [top] }, { roles: sleevePieces, levels: [top] })
    if (cutAtWaist) rows.push({ roles: ['skirt-front', 'skirt-back'], levels: ['waist', 'abdomen', 'hip'] })
    rows.push({ roles: waistPieces, levels: ['waist'] })
  }
  rows.push({ roles: hipPieces, levels: chain })
  return rows
}
