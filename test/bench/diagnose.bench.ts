/** Six observations after warm-up are to take under 2 ms; twelve no more than about twice six. */
import { bench, describe } from 'vitest'
import { diagnose } from '#shared/fit/diagnose.ts'
import { type FitInput } from '#shared/fit/types.ts'
import { fitting } from '../support/fit.ts'
import { look } from '../support/look.ts'

const sees = [
  'drag-lines@bust >side-seam', 'gaping@armhole fold:6', 'rises@hem =front shift:15', 'drag-lines@neck >armhole R', 'excess@waist ~horizontal =centre-back back C fold:8', 'tight@hip cloth:24',
  'tight@sleeve ~horizontal cloth:20', 'off-place@shoulder >front side shift:9', 'gaping@neck =centre-back back C', 'tight@waist cloth:16', 'excess@armhole ~vertical', 'rises@hem =centre-back back C',
]
const dressOf = (count: number): FitInput => fitting({
  garment: { kind: 'dress', sleeves: 'set-in', waist: 'fitted', features: ['darts', 'waist-seam', 'lining'] }, body: { bust: 1020, 'high-bust': 920, waist: 780, hip: 1040, 'upper-arm': 330 },
  pattern: { body: { bust: 960, 'high-bust': 910, waist: 760, hip: 1010 }, draftedCupMm: 50 }, observations: sees.slice(0, count).map((text, i) => look(text, `o${i}`)),
})

describe('diagnose', () => {
  for (const count of [1, 3, 6, 12]) {
    const input = dressOf(count)
    bench(`${count} observations`, () => { diagnose(input) })
  }
})
