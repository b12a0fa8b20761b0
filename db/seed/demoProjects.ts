import { type SeedStudio, nextThursday } from './SeedStudio.ts'
import { almanac, larkrise, ledger, tidemark, towpath } from './demoPatterns.ts'

const standing = ['front', 'back', 'left', 'right'] as const

/** The Ledger jacket: measured, the size to choose. */
export async function hangLedger(studio: SeedStudio, wearerId: string): Promise<void> {
  await studio.hang('Ledger jacket', wearerId, ledger)
}

/** The Almanac dress: sample 1 looked at, sample 2 being sewn with its changes. */
export async function hangAlmanac(studio: SeedStudio, wearerId: string): Promise<void> {
  const id = await studio.hang('Almanac dress', wearerId, almanac)
  await studio.keepSize(id, { bust: '12', waist: '12', hip: '14' }, 'Bust and waist by the body; the skirt is wide, so the hip line only follows.')
  await studio.trace(id, 'Hook 2, behind the skirts')
  const sample = await studio.startSample(id, 'old sheet, washed')
  await studio.moveTo(id, sample, 'to-photograph')
  const pictures = await studio.photograph(id, sample, 'bodice-sample1', ['front', 'back'])
  await studio.note(id, sample, pictures, { kind: 'length', points: [[0.5, 0.65], [0.5, 0.69]], sign: 'rises', zone: 'waist', view: 'front', side: 'both', line: 'centre-front', amount: { mm: 10, as: 'shift' } })
  await studio.note(id, sample, pictures, { kind: 'drag-line', points: [[0.29, 0.54], [0.39, 0.41]], sign: 'drag-lines', zone: 'bust', view: 'front', side: 'both', direction: 'diagonal', towards: 'bust', amount: { mm: 26, as: 'cloth' } })
  await studio.note(id, sample, pictures, { kind: 'excess', shape: 'area', points: [[0.4, 0.57], [0.6, 0.57], [0.6, 0.6], [0.4, 0.6]], sign: 'excess', zone: 'waist', view: 'back', side: 'centre', direction: 'horizontal', line: 'centre-back', amount: { mm: 7, as: 'fold-depth' } })
  await studio.accept(id, sample)
  await studio.moveTo(id, sample, 'reviewed')
  await studio.startSample(id, 'old sheet, washed')
}

/** The Towpath trousers: sample 1 photographed and with the fitter. */
export async function hangTowpath(studio: SeedStudio, wearerId: string): Promise<void> {
  const id = await studio.hang('Towpath trousers', wearerId, towpath, studio.people.jonah)
  await studio.keepSize(id, { waist: '48', hip: '50', thigh: '50' }, 'By the hip; the waist is taken in at the darts.')
  await studio.trace(id, 'Jonah’s roll, top shelf')
  const sample = await studio.startSample(id, 'cotton twill, as heavy as the final cloth')
  await studio.moveTo(id, sample, 'to-photograph')
  const pictures = await studio.photograph(id, sample, 'trousers-sample1', standing)
  const { jonah } = studio.people
  await studio.note(id, sample, pictures, { kind: 'drag-line', points: [[0.42, 0.4], [0.49, 0.5]], sign: 'drag-lines', zone: 'crotch', view: 'front', side: 'both', direction: 'diagonal', towards: 'hip', amount: { mm: 12, as: 'cloth' } }, jonah)
  await studio.note(id, sample, pictures, { kind: 'excess', shape: 'area', points: [[0.38, 0.52], [0.62, 0.52], [0.62, 0.58], [0.38, 0.58]], sign: 'excess', zone: 'seat', view: 'back', side: 'both', direction: 'horizontal', amount: { mm: 9, as: 'fold-depth' } }, jonah)
  await studio.note(id, sample, pictures, { kind: 'balance', points: [[0.5, 0.28], [0.44, 0.9]], sign: 'swings', zone: 'leg', view: 'left', side: 'both', towards: 'back', line: 'side-seam', amount: { mm: 18, as: 'shift' } }, jonah)
  await studio.note(id, sample, pictures, { kind: 'gape', points: [[0.46, 0.2], [0.54, 0.2]], sign: 'gaping', zone: 'waist', view: 'back', side: 'centre', line: 'centre-back', amount: { mm: 8, as: 'fold-depth' } }, jonah)
  await studio.note(id, sample, pictures, { kind: 'tight', points: [[0.36, 0.52], [0.46, 0.52]], sign: 'tight', zone: 'thigh', view: 'front', side: 'both', severity: 1 }, jonah)
  await studio.moveTo(id, sample, 'with-fitter')
  await studio.say(id, studio.people.rosalind, sample, 'The folds under the seat go when you stand with your weight back. Sit once before I decide about the crotch.')
}

/** The Tidemark top: sample 2 partly photographed, two observations still open. */
export async function hangTidemark(studio: SeedStudio, wearerId: string): Promise<void> {
  const id = await studio.hang('Tidemark top', wearerId, tidemark)
  await studio.keepSize(id, { bust: '14', waist: '14', hip: '16' }, 'Nearest at bust and waist, exact at the hip. Sample 1 will tell whether the bust comes out close.')
  await studio.trace(id, 'Hook 3, tops')
  const sample = await studio.startSample(id, 'calico, 150 g/m²')
  await studio.moveTo(id, sample, 'to-photograph')
  const pictures = await studio.photograph(id, sample, 'bodice-sample1', standing)
  const lines = await studio.note(id, sample, pictures, { kind: 'drag-line', points: [[0.293, 0.543], [0.389, 0.41]], sign: 'drag-lines', zone: 'bust', view: 'front', side: 'both', direction: 'diagonal', towards: 'side-seam', amount: { mm: 15, as: 'fold-depth' } })
  const gape = await studio.note(id, sample, pictures, { kind: 'gape', points: [[0.317, 0.24], [0.318, 0.36]], sign: 'gaping', zone: 'armhole', view: 'front', side: 'both', amount: { mm: 12, as: 'gap' } })
  const tight = await studio.note(id, sample, pictures, { kind: 'tight', points: [[0.41, 0.395], [0.59, 0.395]], sign: 'tight', zone: 'bust', view: 'front', side: 'both', amount: { mm: 30, as: 'cloth' } })
  const hem = await studio.note(id, sample, pictures, { kind: 'length', points: [[0.5, 0.64], [0.5, 0.677]], sign: 'rises', zone: 'hem', view: 'front', side: 'centre', line: 'centre-front', amount: { mm: 25, as: 'shift' } })
  const folds = await studio.note(id, sample, pictures, { kind: 'excess', shape: 'area', points: [[0.38, 0.53], [0.62, 0.53], [0.62, 0.61], [0.38, 0.61]], sign: 'excess', zone: 'waist', view: 'back', side: 'centre', direction: 'horizontal', line: 'centre-back', amount: { mm: 10, as: 'fold-depth' } }, studio.people.rosalind)
  const neck = await studio.note(id, sample, pictures, { kind: 'gape', points: [[0.46, 0.225], [0.54, 0.225]], sign: 'gaping', zone: 'neck', view: 'back', side: 'centre', severity: 1, amount: { mm: 6, as: 'gap' } })
  await studio.letBe(id, neck, 'Gone when she stands straight')
  await studio.accept(id, sample, ['full-bust', 'hollow-back'])
  await studio.moveTo(id, sample, 'with-fitter', 'reviewed')

  const second = await studio.startSample(id, 'calico, 150 g/m²')
  await studio.moveTo(id, second, 'to-photograph')
  await studio.photograph(id, second, 'bodice-sample2', ['front', 'back'])
  await studio.drawChanges(id)
  for (const { id: gone } of [lines, tight, hem]) await studio.lookAgain(id, second, gone, { gone: true })
  await studio.lookAgain(id, second, gape.id, { mm: 4, as: 'gap' })
  await studio.lookAgain(id, second, folds.id, { mm: 3, as: 'fold-depth' })
  await studio.say(id, studio.people.rosalind, second, 'The bust is right now. Ask Tamsin to fold her arms before you touch that armhole again.')
  await studio.fittingOn(id, nextThursday())
}

/** The Larkrise skirt: three samples, everything settled, cleared to cut. */
export async function hangLarkrise(studio: SeedStudio, wearerId: string): Promise<void> {
  const id = await studio.hang('Larkrise skirt', wearerId, larkrise)
  await studio.keepSize(id, { waist: 'L', hip: 'M' }, 'The waist is larger than the hip’s size; the edge pulled out still has to pass the hip, so the waist line is L.')
  await studio.trace(id, 'Hook 1, skirts')
  const first = await studio.startSample(id, 'sheeting')
  await studio.moveTo(id, first, 'to-photograph')
  const pictures = await studio.photograph(id, first, 'skirt-sample1', standing)
  const tight = await studio.note(id, first, pictures, { kind: 'tight', points: [[0.33, 0.42], [0.67, 0.42]], sign: 'tight', zone: 'hip', view: 'front', side: 'both', line: 'side-seam', amount: { mm: 32, as: 'cloth' } })
  const back = await studio.note(id, first, pictures, { kind: 'excess', shape: 'area', points: [[0.4, 0.25], [0.6, 0.25], [0.6, 0.3], [0.4, 0.3]], sign: 'excess', zone: 'waist', view: 'back', side: 'centre', direction: 'horizontal', line: 'centre-back', amount: { mm: 8, as: 'fold-depth' } })
  const seam = await studio.note(id, first, pictures, { kind: 'balance', points: [[0.52, 0.25], [0.46, 0.85]], sign: 'swings', zone: 'hem', view: 'left', side: 'both', towards: 'front', line: 'side-seam', severity: 1 })
  // Before anything is accepted: what a change already takes up can no longer be let be.
  await studio.letBe(id, seam, 'It hangs plumb when the elastic sits level')
  await studio.accept(id, first)
  await studio.moveTo(id, first, 'reviewed')

  const second = await studio.startSample(id, 'sheeting')
  await studio.moveTo(id, second, 'to-photograph')
  await studio.photograph(id, second, 'skirt-sample2', standing)
  await studio.drawChanges(id)
  await studio.lookAgain(id, second, tight.id, { mm: 8, as: 'cloth' })
  await studio.lookAgain(id, second, back.id, { gone: true })
  await studio.accept(id, second)
  await studio.moveTo(id, second, 'with-fitter', 'reviewed')

  const third = await studio.startSample(id, 'sheeting')
  await studio.moveTo(id, third, 'to-photograph')
  await studio.photograph(id, third, 'skirt-sample2', standing)
  await studio.drawChanges(id)
  await studio.lookAgain(id, third, tight.id, { gone: true })
  await studio.moveTo(id, third, 'reviewed')
  await studio.say(id, studio.people.rosalind, third, 'It falls straight and you can sit in it. Cut it.')
  await studio.clear(id, { name: 'Linen, washed', widthMm: 1380, lengthMm: 1600, neededMm: 1400, statedWidthMm: 1400 })
}
