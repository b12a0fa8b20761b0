import { type Piece } from '../contracts/piece.ts'
import { type PieceRole } from '../fit/types.ts'

/** The part of a piece its tracing is judged by. */
export type TracedPiece = Pick<Piece, 'role' | 'view' | 'cutCount' | 'onFold' | 'notchCount' | 'dartCount' | 'marks'>

export const tracingMarkKinds = [
  'name', 'view', 'size', 'cut-count', 'fold', 'grainline', 'notches', 'darts', 'allowance', 'lengthen-line', 'centre-line', 'bust-point', 'waist-line', 'hip-line', 'fork-line', 'button-places', 'zip-place', 'pocket-place', 'pleat-lines', 'gather-marks', 'nap',
] as const
export type TracingMark = (typeof tracingMarkKinds)[number]

type MarkRow = {
  name: string
  /** what to draw or write, in a maker's words */
  how: string
  /** said of a tracing that lacks it */
  missing: string
  applies: (piece: TracedPiece) => boolean
  /** cannot be waived on a piece it applies to: the cloth would be cut wrong without it */
  always?: boolean
}

/** Marks only some patterns need: asked once the piece lists them, as a template or the maker does. */
const ifAsked = (mark: string) => (piece: TracedPiece) => mark in piece.marks
const among = (...roles: readonly PieceRole[]) => (piece: TracedPiece) => roles.includes(piece.role)
const bodices = ['bodice-front', 'bodice-back', 'side-front', 'side-back'] as const
const legs = ['trouser-front', 'trouser-back'] as const
const skirts = ['skirt-front', 'skirt-back'] as const
const large = among(...bodices, ...legs, ...skirts, 'sleeve', 'under-sleeve', 'lining')
/** Pieces asked for darts while nobody counted them yet. */
const withDarts = among('bodice-front', 'bodice-back', ...skirts, ...legs)

/** What a tracing carries. Common practice; symbols as pattern-marking teaching pages give them. */
export const tracingMarkTable: Readonly<Record<TracingMark, MarkRow>> = {
  name: { name: 'Piece name', how: 'Write the pattern and the piece: "Larkrise skirt, front".', missing: 'the piece name', applies: () => true, always: true },
  view: { name: 'View', how: 'Write which view of the pattern this piece belongs to.', missing: 'the view', applies: () => true },
  size: { name: 'Size', how: 'Write the size, or both sizes and where one runs into the other.', missing: 'the size', applies: () => true, always: true },
  'cut-count': { name: 'How many to cut', how: 'Write how many, and of which cloth: shell, lining, interlining.', missing: 'how many to cut', applies: () => true, always: true },
  fold: { name: 'Fold', how: 'Draw the bracket with its arrows to the edge that lies on the fold.', missing: 'the fold', applies: ({ onFold }) => onFold, always: true },
  grainline: { name: 'Grainline', how: 'Draw the double arrow, parallel to the selvedge, as long as the piece allows.', missing: 'the grainline', applies: () => true, always: true },
  notches: { name: 'Notches', how: 'Mark every notch at the cutting edge of the size you trace: one for front, two for back.', missing: 'the notches', applies: ({ notchCount }) => notchCount !== 0 },
  darts: { name: 'Darts', how: 'Draw both legs and the point, and mark the feet at the edge.', missing: 'the darts', applies: (piece) => (piece.dartCount === null ? withDarts(piece) : piece.dartCount > 0) },
  allowance: { name: 'Seam allowance', how: 'Write how wide it is, or that the outline is the stitching line.', missing: 'the seam allowance', applies: () => true },
  'lengthen-line': { name: 'Lengthen or shorten line', how: 'Copy the double line across the grain.', missing: 'the lengthen line', applies: large },
  'centre-line': { name: 'Centre line', how: 'Draw the centre front or back where it is not the edge.', missing: 'the centre line', applies: (piece) => !piece.onFold && among('bodice-front', 'skirt-front', 'collar', 'collar-stand', 'waistband')(piece) },
  'bust-point': { name: 'Bust point', how: 'Draw the ringed cross.', missing: 'the bust point', applies: among('bodice-front') },
  'waist-line': { name: 'Waist line', how: 'Draw the waist across, at right angles to the grain.', missing: 'the waist line', applies: among('bodice-front', 'bodice-back') },
  'hip-line': { name: 'Hip line', how: 'Draw the hip across, at right angles to the grain.', missing: 'the hip line', applies: among(...skirts, ...legs) },
  'fork-line': { name: 'Crotch line', how: 'Draw the crotch level across, at right angles to the grain.', missing: 'the crotch line', applies: among(...legs) },
  'button-places': { name: 'Buttons and buttonholes', how: 'Mark each place; they move with every change of length.', missing: 'the button places', applies: ifAsked('button-places') },
  'zip-place': { name: 'End of the opening', how: 'Mark where the opening or the zip ends.', missing: 'the end of the opening', applies: ifAsked('zip-place') },
  'pocket-place': { name: 'Pocket opening', how: 'Mark both ends of the pocket opening.', missing: 'the pocket opening', applies: ifAsked('pocket-place') },
  'pleat-lines': { name: 'Pleat lines', how: 'Draw every fold and placement line, and an arrow the way the pleat is laid.', missing: 'the pleat lines', applies: ifAsked('pleat-lines') },
  'gather-marks': { name: 'Gathers', how: 'Mark where gathering begins and ends.', missing: 'where the gathers begin and end', applies: ifAsked('gather-marks') },
  nap: { name: 'One-way arrow', how: 'Draw an arrow the way the cloth must lie.', missing: 'the one-way arrow', applies: ifAsked('nap') },
}

/** The marks a piece has to carry, in the order they are asked. */
export const marksFor = (piece: TracedPiece): TracingMark[] => tracingMarkKinds.filter((mark) => tracingMarkTable[mark].applies(piece))
