import { type Garment, type GarmentKind, type PieceRole } from '../fit/types.ts'
import { type TracingMark } from './tracingMarks.ts'

export type PieceTemplate = {
  role: PieceRole
  name: string
  cutCount: number
  onFold: boolean
  /** null: count them on the pattern */
  notchCount: number | null
  dartCount: number | null
  /** marks this piece needs beyond the usual ones */
  extraMarks: readonly TracingMark[]
}

const piece = (role: PieceRole, name: string, cutCount: number, onFold: boolean, dartCount: number | null = 0, extraMarks: readonly TracingMark[] = [], notchCount: number | null = null): PieceTemplate => ({ role, name, cutCount, onFold, notchCount, dartCount, extraMarks })

/**
 * The usual pieces of a garment, to start a tracing list from; every line can be changed. Common practice.
 * @returns pieces in the order they are usually cut, large ones first
 */
export function pieceTemplates(garment: Garment): PieceTemplate[] {
  const has = (feature: NonNullable<Garment['features']>[number]) => garment.features?.includes(feature) ?? false
  const elastic = garment.waist === 'elastic'
  const darts = elastic || has('dartless') || has('knit') || has('gathered') ? 0 : null
  const gathers: readonly TracingMark[] = has('gathered') ? ['gather-marks'] : has('pleats') ? ['pleat-lines'] : []
  const pocket = has('pockets') ? [piece('pocket', 'Pocket bag', 4, false)] : []
  const pocketMark: readonly TracingMark[] = has('pockets') ? ['pocket-place'] : []
  const lining = (count: number) => (has('lining') ? [piece('lining', 'Lining, as the shell', count, false)] : [])

  const skirtPieces = (): PieceTemplate[] => [
    piece('skirt-front', garment.kind === 'skirt' ? 'Front' : 'Skirt front', 1, true, darts, [...gathers, ...pocketMark]),
    piece('skirt-back', garment.kind === 'skirt' ? 'Back' : 'Skirt back', elastic ? 1 : 2, elastic, darts, elastic ? gathers : [...gathers, 'zip-place']),
  ]
  const neckAndCollar = (): PieceTemplate[] => {
    if (has('collar')) return [piece('collar', 'Collar', 2, true), ...(garment.kind === 'shirt' ? [piece('collar-stand', 'Collar stand', 2, true, 0, ['button-places'])] : [])]
    return [piece('neck-facing', 'Front neck facing', 1, true), piece('neck-facing', 'Back neck facing', 2, false)]
  }
  const sleevePieces = (): PieceTemplate[] => {
    const twoPiece = has('two-piece-sleeve')
    if (!garment.sleeves || garment.sleeves === 'none') return garment.kind === 'bodice' || garment.kind === 'dress' ? [piece('armhole-facing', 'Front armhole facing', 2, false), piece('armhole-facing', 'Back armhole facing', 2, false)] : []
    return [piece('sleeve', twoPiece ? 'Upper sleeve' : 'Sleeve', 2, false, twoPiece ? 0 : null), ...(twoPiece ? [piece('under-sleeve', 'Under sleeve', 2, false)] : [])]
  }
  const buttons = has('button-front') || garment.kind === 'shirt' || garment.kind === 'jacket' || garment.kind === 'coat'
  const bodicePieces = (): PieceTemplate[] => {
    const front = buttons ? piece('bodice-front', 'Front', 2, false, darts, ['button-places', ...pocketMark]) : piece('bodice-front', 'Front', 1, true, darts, pocketMark)
    const princess = has('princess-seams')
    return [
      { ...front, ...(princess && { dartCount: 0, name: 'Centre front' }) }, ...(princess ? [piece('side-front', 'Side front', 2, false)] : []),
      { ...(buttons ? piece('bodice-back', 'Back', 1, true, darts) : piece('bodice-back', 'Back', 2, false, darts, ['zip-place'])), ...(princess && { dartCount: 0, name: 'Centre back' }) }, ...(princess ? [piece('side-back', 'Side back', 2, false)] : []),
      ...(has('yoke') || garment.kind === 'shirt' ? [piece('yoke', 'Yoke', 2, true)] : []),
    ]
  }
  const kinds: Record<GarmentKind, () => PieceTemplate[]> = {
    skirt: () => [...skirtPieces(), elastic ? piece('casing', 'Waist casing', 1, true) : piece('waistband', 'Waistband', 1, false), ...pocket, ...lining(2)],
    trousers: () => [
      piece('trouser-front', 'Front', 2, false, darts, pocketMark), piece('trouser-back', 'Back', 2, false, darts),
      elastic ? piece('casing', 'Waist casing', 1, true) : piece('waistband', 'Waistband', 2, false), ...(has('fly') || !elastic ? [piece('fly', 'Fly', 2, false, 0, ['zip-place'])] : []), ...pocket, ...lining(4),
    ],
    bodice: () => [...bodicePieces(), ...sleevePieces(), ...neckAndCollar(), ...(buttons ? [piece('front-facing', 'Front facing', 2, false)] : []), ...lining(3)],
    shirt: () => [...bodicePieces(), ...sleevePieces(), ...(garment.sleeves && garment.sleeves !== 'none' ? [piece('cuff', 'Cuff', 4, false, 0, ['button-places'])] : []), ...neckAndCollar(), ...(has('collar') ? [] : [piece('front-facing', 'Front facing', 2, false)]), ...pocket],
    dress: () => [...bodicePieces(), ...(has('waist-seam') ? skirtPieces() : []), ...sleevePieces(), ...neckAndCollar(), ...(buttons ? [piece('front-facing', 'Front facing', 2, false)] : []), ...pocket, ...lining(4)],
    jacket: () => [...bodicePieces(), ...sleevePieces(), ...neckAndCollar(), piece('front-facing', 'Front facing', 2, false, 0, ['button-places']), ...pocket, ...lining(5)],
    coat: () => [...bodicePieces(), ...sleevePieces(), ...neckAndCollar(), piece('front-facing', 'Front facing', 2, false, 0, ['button-places']), ...pocket, ...lining(5)],
  }
  return kinds[garment.kind]()
}

/** The marks a new piece starts with: its extra ones listed as missing, the usual ones asked by themselves. */
export const startMarks = ({ extraMarks }: PieceTemplate): Record<string, 'missing'> => Object.fromEntries(extraMarks.map((mark) => [mark, 'missing']))
