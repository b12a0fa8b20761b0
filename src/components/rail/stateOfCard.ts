import { type Role } from '#shared/contracts/permissions.ts'
import { type ProjectCard } from '#shared/contracts/project.ts'
import { sampleStateWords } from '@/composables/project/sampleWords.ts'

/** The one line of state on a card; `waits` when the next step is this person's: the maker's, or the fitter's once a sample is with them. */
export function stateOfCard({ stage, sample }: Pick<ProjectCard, 'stage' | 'sample'>, role: Role): { text: string; tone: 'waits' | 'done' | 'calm' } {
  if (stage === 'resting') return { text: 'Resting', tone: 'calm' }
  if (stage === 'cleared') return { text: 'Cleared to cut', tone: 'done' }
  if (stage === 'cut') return { text: 'Cut', tone: 'done' }
  const makes = role === 'owner' || role === 'maker'
  if (!sample) return { text: stage === 'size' ? 'Size to choose' : 'Pieces to trace', tone: makes ? 'waits' : 'calm' }
  const turn = makes ? ['to-photograph', 'reviewed'] : role === 'fitter' ? ['with-fitter'] : []
  return { text: `Sample ${sample.number} · ${sampleStateWords[sample.state]}`, tone: turn.includes(sample.state) ? 'waits' : 'calm' }
}

/** What is next at this person's table: the dated fitting, else the first sample whose turn it is; for the fitter what waits for their eye. */
export function nextAtTable(cards: readonly ProjectCard[], role: Role): ProjectCard | null {
  if (role === 'fitter') return cards.find(({ sample }) => sample?.state === 'with-fitter') ?? null
  const dated = cards.filter(({ nextFittingAt }) => nextFittingAt !== null).toSorted((a, b) => Date.parse(a.nextFittingAt!) - Date.parse(b.nextFittingAt!))
  return dated[0] ?? (role === 'wearer' ? null : cards.find(({ sample }) => sample?.state === 'to-photograph') ?? null)
}
