import { marksFor, tracingMarkTable, type TracedPiece, type TracingMark } from './tracingMarks.ts'

/**
 * The marks a tracing still lacks, in the order they are asked. A mark set to `not-needed` is not asked again, except name, size, cut
 * count, grainline and fold, and notches and darts that were counted: without those the cloth is cut wrong.
 */
export function missingMarks(piece: TracedPiece): TracingMark[] {
  return marksFor(piece).filter((mark) => {
    const state = piece.marks[mark]
    return state !== 'marked' && (state !== 'not-needed' || isFixed(piece, mark))
  })
}

/** Whether a mark may not be waived on this piece. */
export function isFixed(piece: TracedPiece, mark: TracingMark): boolean {
  if (mark === 'notches') return (piece.notchCount ?? 0) > 0
  if (mark === 'darts') return (piece.dartCount ?? 0) > 0
  return tracingMarkTable[mark].always ?? false
}

/** A tracing is ready to cut a sample from when nothing it needs is missing. */
export const isReady = (piece: TracedPiece): boolean => missingMarks(piece).length === 0
/** A tracing list is ready when there is at least one piece and every piece is. */
export const allReady = (pieces: readonly TracedPiece[]): boolean => pieces.length > 0 && pieces.every(isReady)

/** "Missing: the grainline and the notches." Empty where nothing is. */
export function missingSentence(piece: TracedPiece): string {
  const words = missingMarks(piece).map((mark) => tracingMarkTable[mark].missing)
  if (!words.length) return ''
  return `Missing: ${words.length > 1 ? `${words.slice(0, -1).join(', ')} and ${words.at(-1)}` : words[0]}.`
}
