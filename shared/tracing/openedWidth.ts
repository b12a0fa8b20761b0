/** Width of the cloth piece: a piece cut on the fold opens to twice the paper, any other keeps its width. */
export const openedWidth = (paperWidthMm: number, onFold: boolean): number => (onFold ? 2 * paperWidthMm : paperWidthMm)

/** How many pieces of cloth come off one tracing: each cut once, on the fold or single. */
export const clothPieces = (pieces: readonly { cutCount: number }[]): number => pieces.reduce((sum, { cutCount }) => sum + cutCount, 0)
