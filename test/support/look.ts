import { type Amount, type Direction, type Line, type Observation, type Side, type Sign, type Target, type View, type Zone } from '#shared/fit/types.ts'

const sideOf: Record<string, Side> = { L: 'left', R: 'right', B: 'both', C: 'centre' }
const viewOf: Record<string, View> = { front: 'front', back: 'back', side: 'left', detail: 'detail' }
const kindOf: Record<string, Amount['as']> = { fold: 'fold-depth', cloth: 'cloth', gap: 'gap', shift: 'shift' }

/**
 * An observation in one line: `sign@zone`, then in any order `>towards`, `~direction`, `=line`, a view (front, back, side, detail), a
 * side (L, R, B, C), an amount (`fold:8`, `cloth:40`, `gap:14`, `shift:12`) and a severity (`!3`). Front, both sides and clear unless said.
 */
export function look(text: string, id: string): Observation {
  const [what, ...rest] = text.split(' ') as [string, ...string[]]
  const [sign, zone] = what.split('@') as [Sign, Zone]
  const seen: Observation = { id, sign, zone, view: 'front', side: 'both', severity: 2 }
  for (const word of rest) {
    const [kind, mm] = word.split(':')
    if (word.startsWith('>')) seen.towards = word.slice(1) as Target
    else if (word.startsWith('~')) seen.direction = word.slice(1) as Direction
    else if (word.startsWith('=')) seen.line = word.slice(1) as Line
    else if (word.startsWith('!')) seen.severity = Number(word.slice(1)) as Observation['severity']
    else if (mm !== undefined) seen.amount = { mm: Number(mm), as: kindOf[kind!]! }
    else if (sideOf[word]) seen.side = sideOf[word]
    else if (viewOf[word]) seen.view = viewOf[word]
    else throw new Error(`“${word}” means nothing in “${text}”`)
  }
  return seen
}
