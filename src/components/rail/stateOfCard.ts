import { type ProjectCard } from '#shared/contracts/project.ts'
import { sampleStateWords } from '@/composables/project/sampleWords.ts'

/** The one line of state on a card; `waits` is what the maker has to do next. */
export function stateOfCard({ stage, sample }: Pick<ProjectCard, 'stage' | 'sample'>): { text: string; tone: 'waits' | 'done' | 'calm' } {
  if (stage === 'resting') return { text: 'Resting', tone: 'calm' }
  if (stage === 'cleared') return { text: 'Cleared to cut', tone: 'done' }
  if (stage === 'cut') return { text: 'Cut', tone: 'done' }
  if (!sample) return stage === 'size' ? { text: 'Size to choose', tone: 'waits' } : { text: 'Pieces to trace', tone: 'waits' }
  return { text: `Sample ${sample.number} · ${sampleStateWords[sample.state]}`, tone: sample.state === 'to-photograph' || sample.state === 'reviewed' ? 'waits' : 'calm' }
}
