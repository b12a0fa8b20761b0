/**
 * The words of the rules module: what a fitting is, and what the module answers.
 * Everything is plain data; all lengths are millimetres.
 *
 * Texts the module answers with carry their amounts as tokens, since only the reader knows whether they read centimetres or inches:
 * `{mm:16}` is a length, `{+mm:-16}` a change with its sign. `fillAmounts` in `amountText.ts` turns them into words. They stand in
 * `because`, `steps[].text`, companions, notes, `limits.text`, `response.text`, predictions, conflicts, `unexplained` and `missing`.
 */

export const garmentKinds = ['skirt', 'trousers', 'bodice', 'shirt', 'dress', 'jacket', 'coat'] as const
export type GarmentKind = (typeof garmentKinds)[number]

export const waistKinds = ['fitted', 'elastic', 'none'] as const
export const sleeveKinds = ['none', 'set-in', 'dropped', 'raglan'] as const
/** What else matters for the fit; a rule may ask for one of these or exclude it. */
export const garmentFeatures = [
  'darts', 'princess-seams', 'dartless', 'collar', 'button-front', 'waist-seam', 'waistband', 'gathered', 'pleats',
  'lining', 'pockets', 'fly', 'straight', 'flared', 'full', 'yoke', 'vent', 'two-piece-sleeve', 'knit', 'bias', 'children',
] as const
export type GarmentFeature = (typeof garmentFeatures)[number]

export type Garment = {
  kind: GarmentKind
  waist?: (typeof waistKinds)[number]
  sleeves?: (typeof sleeveKinds)[number]
  features?: readonly GarmentFeature[]
}

export const signs = [
  'drag-lines', 'gaping', 'tight', 'binds', 'excess', 'rises', 'drops', 'short', 'long', 'swings', 'off-place',
] as const
export type Sign = (typeof signs)[number]

export const zones = [
  'neck', 'shoulder', 'upper-back', 'bust', 'armhole', 'sleeve', 'waist', 'midriff', 'abdomen', 'hip', 'seat',
  'crotch', 'thigh', 'knee', 'leg', 'hem', 'whole',
] as const
export type Zone = (typeof zones)[number]

export const views = ['front', 'back', 'left', 'right', 'detail'] as const
export type View = (typeof views)[number]

export const sides = ['left', 'right', 'both', 'centre'] as const
export type Side = (typeof sides)[number]

export const directions = ['horizontal', 'vertical', 'diagonal', 'radiating'] as const
export type Direction = (typeof directions)[number]

/** Where a drag line points or is caught, or which way a seam swings; for `off-place` the way it has to go: a dart point below the bust point is 'up'. */
export const targets = [
  'front', 'back', 'up', 'down', 'in', 'out', 'neck', 'shoulder-tip', 'bust', 'underarm', 'armhole', 'shoulder-blade',
  'side-seam', 'waist', 'abdomen', 'hip', 'seat', 'crotch', 'thigh', 'knee', 'elbow', 'hem',
] as const
export type Target = (typeof targets)[number]

export const lines = ['centre-front', 'centre-back', 'side-seam', 'front', 'back', 'inseam', 'crotch', 'waistband', 'collar', 'cap', 'dart'] as const
export type Line = (typeof lines)[number]

/**
 * How an amount was measured. `fold-depth`: a pinched fold lying flat, twice as much cloth is in it. `cloth`: cloth to add
 * or remove, whole as sign and side say. `gap`: an opening that will not close. `shift`: how far a seam, point or hem is off its place.
 */
export const amountKinds = ['fold-depth', 'cloth', 'gap', 'shift'] as const
export type AmountKind = (typeof amountKinds)[number]
export type Amount = { mm: number; as: AmountKind }

export type Severity = 1 | 2 | 3

export type Observation = {
  id: string
  sign: Sign
  zone: Zone
  view: View
  side: Side
  direction?: Direction
  towards?: Target
  line?: Line
  severity: Severity
  amount?: Amount
}

/** A change that is already in the sample, and what it did where that is known. */
export type LedgerEntry = {
  cause: string
  /** whole amount on the body put into the paper so far, signed as the rule's change is */
  amountMm: number
  side: Side
  /** the part of `amountMm` that is sewn in but was not looked at on a sample yet, signed; left out: none of it */
  unreadMm?: number
  /** every sample this change was looked at on, oldest first */
  readings: readonly LedgerReading[]
}
export type LedgerReading = {
  observationId: string
  sign: Sign
  zone: Zone
  /** what the observation measured before and after, cloth in mm, positive as first seen; negative after = reversed */
  beforeMm: number
  afterMm: number
  /** what the change was predicted to take away (`changeMm` of the prediction, in proportion where another amount was put in), cloth in mm, > 0 */
  predictedMm: number
}

/** Measurement code → millimetres (see shared/measurements). */
export type Body = Readonly<Record<string, number>>

export type SampleCloth = { stretchPercent?: number; finalStretchPercent?: number; stiffer?: boolean }

export type FitInput = {
  garment: Garment
  body: Body
  pattern: { body: Body; finished?: Body; draftedCupMm?: number }
  observations: readonly Observation[]
  answers: Readonly<Record<string, 'yes' | 'no'>>
  ledger: readonly LedgerEntry[]
  cloth?: SampleCloth
  /** paper amounts are whole millimetres, or sixteenths of an inch for 'inch'; left out: 'cm' */
  unit?: 'cm' | 'inch'
}

export type Check = {
  /** `cause~rival`, or the id a rule gives it; answers are kept under it */
  id: string
  /** what to do, as a fitter would say it */
  ask: string
  /** what a yes means */
  yes: string
  no: string
}

export type Evidence = {
  text: string
  speaks: 'for' | 'against'
  strength: 'slight' | 'fair' | 'strong' | 'decisive'
  /** the observation, measurement or answer it rests on */
  from: { observation: string } | { measurement: string } | { answer: string } | { ledger: string }
}

export type Prediction = { observationId: string; text: string; /** cloth left, in mm */ expectedMm: number; /** what the change should take away */ changeMm: number }

/** The flat-pattern operations a change is made of. */
export const operations = [
  'lengthen', 'slash-hinge', 'spread', 'full-bust', 'dart-rotate', 'dart-intake', 'dart-apex', 'seam-shift', 'shoulder-slope',
  'shoulder-forward', 'curve-depth', 'point-move', 'sleeve-biceps', 'crotch-extension', 'unfold', 'elastic-length', 'none',
] as const
export type Operation = (typeof operations)[number]

export const pieceRoles = [
  'skirt-front', 'skirt-back', 'trouser-front', 'trouser-back', 'bodice-front', 'bodice-back', 'side-front', 'side-back',
  'yoke', 'sleeve', 'under-sleeve', 'cuff', 'collar', 'collar-stand', 'waistband', 'neck-facing', 'front-facing', 'armhole-facing', 'casing',
  'pocket', 'lining', 'fly', 'belt', 'tier',
] as const
export type PieceRole = (typeof pieceRoles)[number]

export type ChangeStep = {
  pieceRole: PieceRole
  side: 'both' | 'left' | 'right'
  /** the edge or line on that piece, in the trade's words */
  edge: string
  /** signed: + adds to the paper, − takes away */
  amountMm: number
  /** how many such paper edges take this amount */
  edges: number
  /** where the amount runs out to nothing; empty when it does not */
  taper?: string
  /** one numbered instruction for ruler and tape */
  text: string
}

export type PaperChange = {
  /** an instruction: "Take a fold out across the back waist" */
  title: string
  operation: Operation
  /** the whole amount on the body, signed: + adds cloth, − takes away */
  amountMm: number
  amountFrom: 'measured on sample' | 'measurements' | 'usual for this sign'
  /** another way to the amount that disagrees by more than 10 mm */
  otherAmount?: { amountMm: number; amountFrom: PaperChange['amountFrom'] }
  steps: readonly ChangeStep[]
  companions: readonly { pieceRole: PieceRole; text: string; amountMm?: number }[]
  limits: { leastMm: number; mostMm: number; beyond: string; text: string }
  recheck: readonly string[]
  /** true where left and right must be traced apart */
  unfold: boolean
  notes: readonly string[]
  source: string
}

export type Finding = {
  cause: string
  /** what the cloth is, never what the body is: "The front is too short and narrow over the bust" */
  sentence: string
  side: Side
  /** 0..1 */
  confidence: number
  explains: readonly string[]
  because: readonly Evidence[]
  rivals: readonly { cause: string; sentence: string; confidence: number; tellApart: Check | null }[]
  change: PaperChange
  predicts: readonly Prediction[]
  /** set when an earlier change for this cause is in the sample */
  response?: { value: number; soFarMm: number; text: string }
  /** 'leave-it' when the amount is too small, 'bring-back' when a change made it worse */
  advice: 'change' | 'leave-it' | 'bring-back'
}

export type Diagnosis = {
  findings: readonly Finding[]
  unexplained: readonly { observationId: string; lookNext: string }[]
  conflicts: readonly { observationIds: readonly string[]; text: string }[]
  /** what would make the answer surer: missing measurements, views, amounts */
  missing: readonly string[]
}
