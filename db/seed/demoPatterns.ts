import { type patternInput } from '#shared/contracts/pattern.ts'
import { type lineStyles } from '#shared/contracts/pattern.ts'
import { type z } from 'zod'

type Pattern = z.output<typeof patternInput>
type LineStyle = (typeof lineStyles)[number]
const styles: readonly LineStyle[] = ['solid', 'long-dash', 'short-dash', 'dotted', 'dash-dot', 'dash-dot-dot']

/** Rows of a chart from columns in cm; `ease` in cm gives the finished measurements. */
function chart(labels: readonly string[], bodyCm: Readonly<Record<string, readonly number[]>>, easeCm: Readonly<Record<string, number>>): Pattern['chart'] {
  return labels.map((label, i) => ({
    label, lineStyle: styles[i % styles.length]!,
    body: Object.fromEntries(Object.entries(bodyCm).map(([code, row]) => [code, Math.round(row[i]! * 10)])),
    finished: Object.fromEntries(Object.entries(easeCm).map(([code, ease]) => [code, Math.round((bodyCm[code]![i]! + ease) * 10)])),
  }))
}

const misses = ['10', '12', '14', '16', '18', '20']
const missesCm = { bust: [88, 92, 96, 100, 105, 110], waist: [70, 74, 78, 82, 87, 92], hip: [94, 98, 102, 106, 111, 116], 'back-waist-length': [40.4, 40.8, 41.2, 41.6, 42, 42.4] }
const base = { origin: 'own draft', view: '', draftedCupMm: 50, allowanceMm: 15, note: 'Invented for the demo studio.' } as const

export const tidemark: Pattern = { ...base, name: 'Tidemark top', garment: { kind: 'bodice', waist: 'fitted', sleeves: 'none', features: ['darts'] }, chart: chart(misses, missesCm, { bust: 6, waist: 8, hip: 7 }) }
export const almanac: Pattern = { ...base, name: 'Almanac dress', view: 'B, sleeveless', garment: { kind: 'dress', waist: 'fitted', sleeves: 'none', features: ['darts', 'waist-seam', 'flared'] }, chart: chart(misses, missesCm, { bust: 6.5, waist: 4, hip: 20 }) }
export const ledger: Pattern = { ...base, name: 'Ledger jacket', garment: { kind: 'jacket', waist: 'fitted', sleeves: 'set-in', features: ['collar', 'button-front', 'lining', 'pockets'] }, chart: chart(misses, missesCm, { bust: 11, waist: 12, hip: 10 }) }
export const larkrise: Pattern = {
  ...base, name: 'Larkrise skirt', view: 'Pull-on', draftedCupMm: null, garment: { kind: 'skirt', waist: 'elastic', sleeves: 'none', features: ['gathered', 'straight'] },
  // The waist edge is measured pulled out, without its elastic: it has to pass the hip.
  chart: chart(['S', 'M', 'L', 'XL'], { waist: [66, 74, 84, 96], hip: [92, 100, 110, 122] }, { waist: 34, hip: 8 }),
}
export const towpath: Pattern = {
  ...base, name: 'Towpath trousers', draftedCupMm: null, garment: { kind: 'trousers', waist: 'fitted', sleeves: 'none', features: ['darts', 'waistband', 'fly', 'pockets'] },
  chart: chart(['46', '48', '50', '52', '54'], { waist: [80, 84, 88, 92, 96], hip: [94, 98, 102, 106, 110], thigh: [55, 57, 59, 61, 63], 'crotch-depth': [25.5, 26, 26.5, 27, 27.5] }, { waist: 2, hip: 6, thigh: 5 }),
}
