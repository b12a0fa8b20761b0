import { describe, expect, it } from 'vitest'
import { type ProjectCard } from '#shared/contracts/project.ts'
import { nextAtTable, stateOfCard } from '../../../src/components/rail/stateOfCard.ts'

const sample = (state: NonNullable<ProjectCard['sample']>['state'], number = 1) => ({ stage: 'sample' as const, sample: { number, state } })
const card = (name: string, more: Partial<ProjectCard> = {}) => ({ name, nextFittingAt: null, sample: null, stage: 'size', ...more }) as ProjectCard

describe('state of a card', () => {
  it('waits for the maker where the maker has the next step', () => {
    expect(stateOfCard({ stage: 'size', sample: null }, 'maker')).toEqual({ text: 'Size to choose', tone: 'waits' })
    expect(stateOfCard(sample('to-photograph', 2), 'owner')).toEqual({ text: 'Sample 2 · to photograph', tone: 'waits' })
    expect(stateOfCard(sample('with-fitter'), 'maker').tone).toBe('calm')
  })
  it('waits for the fitter only while the sample is with them, and never for the wearer', () => {
    expect(stateOfCard(sample('with-fitter'), 'fitter').tone).toBe('waits')
    expect(stateOfCard(sample('to-photograph'), 'fitter').tone).toBe('calm')
    expect(stateOfCard({ stage: 'size', sample: null }, 'wearer').tone).toBe('calm')
  })
  it('is done when the cloth may be cut, and rests when it rests', () => {
    expect(stateOfCard({ stage: 'cleared', sample: null }, 'maker')).toEqual({ text: 'Cleared to cut', tone: 'done' })
    expect(stateOfCard({ stage: 'resting', sample: { number: 1, state: 'to-photograph' } }, 'maker').tone).toBe('calm')
  })
})

describe('what is next at the table', () => {
  const photograph = card('photograph', sample('to-photograph'))
  const withFitter = card('with the fitter', sample('with-fitter'))
  const later = card('later', { nextFittingAt: '2026-12-05T09:00:00+02:00' })
  // Earlier, though its text sorts after: the offset counts.
  const sooner = card('sooner', { nextFittingAt: '2026-12-05T08:30:00+03:00' })
  it('is the earliest dated fitting, else a sample to photograph', () => {
    expect(nextAtTable([photograph, later, sooner], 'maker')?.name).toBe('sooner')
    expect(nextAtTable([withFitter, photograph], 'maker')?.name).toBe('photograph')
    expect(nextAtTable([withFitter], 'maker')).toBeNull()
  })
  it('is what waits for the fitter’s eye', () => expect(nextAtTable([later, photograph, withFitter], 'fitter')?.name).toBe('with the fitter'))
  it('is for a wearer only a fitting with a date', () => {
    expect(nextAtTable([photograph, later], 'wearer')?.name).toBe('later')
    expect(nextAtTable([photograph], 'wearer')).toBeNull()
  })
})
