export type CellLine = { /** counted from 1, as pasted */ line: number; cells: string[] }

const delimiters = ['\t', ';', '|', ','] as const

/**
 * Splits pasted text into cells: tabs as spreadsheets paste them, else semicolons, bars or commas, else runs of spaces. Quoted cells
 * keep their delimiter ("88,5"). Empty lines are left out but counted.
 */
export function splitCells(text: string): { lines: CellLine[]; delimiter: string } {
  const rows = text.replace(/\r\n?/g, '\n').split('\n').map((content, i) => ({ line: i + 1, content })).filter(({ content }) => content.trim() && !/^[\s|:+-]+$/.test(content))
  const delimiter = delimiters.find((mark) => rows.some(({ content }) => content.includes(mark))) ?? ' '
  return { delimiter, lines: rows.map(({ line, content }) => ({ line, cells: delimiter === ' ' ? bySpaces(content) : byMark(content, delimiter) })) }
}

function byMark(content: string, mark: string): string[] {
  const cells: string[] = []
  let cell = ''
  let quoted = false
  const bare = mark === '|' ? content.trim().replace(/^\||\|$/g, '') : content
  for (let i = 0; i < bare.length; i++) {
    const char = bare[i]!
    // A quote opens a cell only at its start: elsewhere it is the inch mark of 38 1/4".
    if (char === '"' && !quoted && !cell.trim()) quoted = true
    else if (char === '"' && quoted && bare[i + 1] === '"') { cell += '"'; i++ }
    else if (char === '"' && quoted) quoted = false
    else if (char === mark && !quoted) { cells.push(cell.trim()); cell = '' }
    else cell += char
  }
  return [...cells, cell.trim()]
}

/** Words up to the first figure are the heading; "38 1/4" stays one cell. */
function bySpaces(content: string): string[] {
  const wide = content.trim().split(/\s{2,}/)
  if (wide.length > 2) return wide
  const words = content.trim().split(/\s+/)
  if (/^sizes?$/i.test(words[0]!)) return words
  const first = words.findIndex((word) => /^[\d½¼¾⅛⅜⅝⅞]/.test(word))
  if (first <= 0) return words
  const values = words.slice(first).reduce<string[]>((cells, word) => {
    const joins = /^(\d+\/\d+"?|[½¼¾⅛⅜⅝⅞]"?|cm|mm|in|")$/.test(word) && cells.length && /^\d+([ -]\d+\/\d+)?$/.test(cells.at(-1)!)
    return joins ? [...cells.slice(0, -1), `${cells.at(-1)} ${word}`] : [...cells, word]
  }, [])
  return [words.slice(0, first).join(' '), ...values]
}
