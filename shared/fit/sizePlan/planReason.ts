import { levelWord } from './garmentZones.ts'
import { type SizePlan, type ZonePlan } from './types.ts'
import { noiseMm } from './zoneSize.ts'

/** The plan in a few sentences: how near, what leads, what comes out close or loose. */
export function planReason(governing: SizePlan['governing'], zones: readonly ZonePlan[]): string {
  const measured = zones.filter(({ bodyMm, cut }) => bodyMm !== null && cut)
  if (!measured.length) return ''
  const exact = measured.filter(({ cut, chosen }) => !chosen && Math.abs(cut!.bodyOverMm) < noiseMm)
  const chosen = measured.filter((zone) => zone.chosen && zone.index !== zone.recommended.index)
  const near = measured.filter((zone) => !exact.includes(zone) && !chosen.includes(zone) && !zone.offChart)
  const parts = [near.length ? `nearest at ${list(near)}` : '', exact.length ? `exact at ${list(exact)}` : '', chosen.length ? `your own choice at ${list(chosen)}` : ''].filter(Boolean).join(', ')
  const close = measured.filter(({ againstDesignMm }) => againstDesignMm !== null && againstDesignMm <= -noiseMm)
  const loose = measured.filter(({ againstDesignMm }) => againstDesignMm !== null && againstDesignMm >= noiseMm)
  return [
    parts && `${parts[0]!.toUpperCase()}${parts.slice(1)}.`,
    governing?.reason,
    close.length && `${capital(list(close))} ${close.length > 1 ? 'come' : 'comes'} out a little closer than the pattern means; sample 1 will tell if it matters.`,
    loose.length && `${capital(list(loose))} ${loose.length > 1 ? 'come' : 'comes'} out a little looser, which is easily taken in.`,
  ].filter(Boolean).join(' ')
}

function list(zones: readonly ZonePlan[]): string {
  const words = zones.map(({ code }) => levelWord(code))
  return words.length > 1 ? `${words.slice(0, -1).join(', ')} and ${words.at(-1)}` : `the ${words[0]!}`
}
const capital = (text: string) => text[0]!.toUpperCase() + text.slice(1)
