/**
 * The shape of a rule. A rule is data: it lives in `rules/<zone>.ts`, the engine has no line about any single cause.
 * Texts may hold amounts as tokens (see `amountText.ts`): `{mm:16}` and, signed, `{+mm:-16}`.
 */
import { type Cause } from './causes.ts'
import {
  type AmountKind, type Direction, type Garment, type GarmentFeature, type GarmentKind, type Line, type Operation, type PieceRole, type Sign, type Target, type Zone,
} from './types.ts'
import { type Strength } from './weights.ts'

export type OneOrMore<T> = T | readonly T[]

/** Every part that stands must hold; a part left out holds always. */
export type When = {
  kinds?: readonly GarmentKind[]
  /** a garment that does not say how its waist or sleeves are passes */
  waist?: readonly NonNullable<Garment['waist']>[]
  sleeves?: readonly NonNullable<Garment['sleeves']>[]
  /** at least one of these features must be there */
  needs?: readonly GarmentFeature[]
  /** none of these may be there */
  without?: readonly GarmentFeature[]
}

/** `side` is a photograph from the left or the right. A detail photograph fits every view, one grade weaker. */
export type PatternView = 'front' | 'back' | 'side'

/**
 * One sign that speaks for the cause, or against it. What the pattern does not say fits anything. What it says must be so;
 * where the observation leaves a direction, target or line open, it counts one grade weaker. Of several patterns that fit
 * one observation the strongest counts, so put the general pattern beside the exact one.
 */
export type SignPattern = {
  sign: OneOrMore<Sign>
  zone: OneOrMore<Zone>
  view?: OneOrMore<PatternView>
  /** 'one': on one side only; 'both': on both sides or at the centre; 'centre': at the centre only. Left out: any */
  side?: 'one' | 'both' | 'centre'
  direction?: OneOrMore<Direction>
  towards?: OneOrMore<Target>
  line?: OneOrMore<Line>
  weight: Strength
  /** speaks against the cause */
  against?: true
  /** the reason in plain words: "a full bust pulls the armhole edge away". Completes "<what was seen>: …", no capital, no full stop */
  because: string
  /**
   * Ways of measuring this sign that give the rule's whole amount, each with the factor that makes the cloth into that whole
   * amount. A fold's depth is doubled before, so `{ 'fold-depth': 1 }` is right for a plain fold. `cloth`, `gap` and `fold-depth`
   * are all cloth and stand in for each other; `shift` is never taken unless it stands here (a hem that rises by 20 does not say how
   * much bust width is missing). Without `amounts` the sign gives no amount at all.
   */
  amounts?: Partial<Record<AmountKind, number>>
  /** kinds in `amounts` that people measure on each side apart: where the side is 'both', the whole is twice that */
  perSide?: readonly AmountKind[]
  /** what it should read on the next sample, a sentence: "The front hem hangs level." Left out: `predicts` of the rule */
  after?: string
}

/** `body:code` the wearer, `pattern:code` the body the size is drafted for, `finished:code` the garment, `drafted-cup`. */
export type MeasureRef = `body:${string}` | `pattern:${string}` | `finished:${string}` | 'drafted-cup'

/**
 * What the measurements say: value = sum of `plus` − sum of `minus` − `lessMm`. Without every measurement it says nothing.
 * With `leftRight` every code is read with `-left` and with `-right`, the value is left − right, and a value below zero speaks for
 * the other side with its size: give the side that is treated when left is larger.
 */
export type MeasurePattern = {
  plus: readonly MeasureRef[]
  minus: readonly MeasureRef[]
  /** wearing ease and the like, mm, taken off the value */
  lessMm?: number
  leftRight?: 'larger-side' | 'smaller-side'
  /** the first row from the top whose bounds hold counts: `from` ≤ value < `below` */
  grades: readonly { from?: number; below?: number; weight: Strength; against?: true }[]
  /** factor from the value to the whole amount (unsigned); left out: it gives no amount */
  amount?: number
  /** raises the cause even where other things were seen on the sample and this was not; before the first look every measurement that gives an amount does */
  alone?: true
  /** the reason with `{value}` for the value: "the full bust is {value} more than this pattern allows for" */
  because: string
}

/** The check a fitter makes. `yes` speaks for this rule, `no` for the rival, unless `yesMeans` turns it round. */
export type Rival = {
  cause: Cause
  check: {
    /** left out: `<this cause>~<rival>`. Lower case, digits, hyphens, `~`. Give the same id where two rules share one check */
    id?: string
    /** what to do, one or two sentences, ends as a question */
    ask: string
    /** what a yes means, a sentence */
    yes: string
    no: string
    yesMeans?: 'this' | 'rival'
  }
}

/**
 * How the whole amount goes onto paper edges.
 * `width`: divided over all edges of all width steps of one `group`, both sides of the body together.
 * `side`: the whole stands for each side and is divided over that side's edges (a shoulder that opens 14: 7 front, 7 back).
 * `length`: never divided; every piece takes the whole × `times`.
 */
export type StepRule = {
  piece: PieceRole
  /** the edge or line, in the trade's words: 'side seam', 'dart legs', 'hip line' */
  edge: string
  /** paper edges on both sides of the body together: two side seams are 2 on the front and 2 on the back. A piece on the fold that is halved counts 2; a centre line counts 1 */
  edges: number
  share: 'width' | 'side' | 'length'
  /** which part of the whole, see `parts` of the change; steps without one are one group */
  group?: string
  /** length only: −1 where this piece moves the other way, 0.5 for half, 0 for "nothing here" */
  times?: number
  /** where it runs to nothing: 'to nothing at the side seam' */
  taper?: string
  /**
   * One instruction for ruler and tape. `{amount}` this edge's amount, unsigned; `{whole}` the whole, unsigned; `{half}` half the whole;
   * `{side}` "left", "right" or "left and right". Full sentence.
   */
  text: string
  when?: When
}

export type CompanionRule = {
  piece: PieceRole
  /** may use {amount} and {whole} */
  text: string
  /** factor of the whole; left out: no amount */
  times?: number
  when?: When
  /**
   * 'pull-on': only where the garment has an elastic waist and its top edge, by the measurements known, does not pass over
   * the hip; the amount is then what is missing there, or the whole where it is not known.
   */
  only?: 'pull-on'
}

export const stages = ['length', 'balance', 'neck', 'shoulder', 'bust', 'waist', 'hip', 'dart', 'sleeve', 'hem'] as const
export type Stage = (typeof stages)[number]

/** Strokes on a figure of 200 × 400; x and y are fractions 0..1 of it, y down. The figure faces us, turns its back, or faces left. */
export type SignDrawing = {
  figure: 'front' | 'back' | 'side'
  /** the part shown large, as fractions: left, top, right, bottom */
  region: readonly [number, number, number, number]
  strokes: readonly {
    /** drag: taut line; fold: soft fold; gape: edge that stands off; press: strain; level: hem or waist line; plumb: seam off the plumb; place: point off its place */
    kind: 'drag' | 'fold' | 'gape' | 'press' | 'level' | 'plumb' | 'place'
    from: readonly [number, number]
    to: readonly [number, number]
    /** bend of the stroke: how far its middle lies off the straight line, as a fraction of the figure's width, to the right of the way */
    bend?: number
  }[]
}

/** Marks on the outline of a piece, as fractions 0..1 of its box, centre line on the left, y down. */
export type ChangeDrawing = {
  piece: PieceRole
  marks: readonly {
    /** cut: line to cut; hinge: point that stays joined; spread: wedge or strip opened; overlap: wedge or fold closed; taper: new edge that runs to nothing; move: a point and where it goes */
    kind: 'cut' | 'hinge' | 'spread' | 'overlap' | 'taper' | 'move'
    from: readonly [number, number]
    to: readonly [number, number]
    label?: string
  }[]
}

export type Rule = {
  cause: Cause
  /** an instruction: "Take a wedge out at the centre back waist" */
  title: string
  /** what the cloth is, never what the body is: "The back is longer at the centre than it needs to be." */
  sentence: string
  /** by which a beginner recognises it: "One soft fold lies across, just under the back waistband; front and sides are smooth." */
  recognise: string
  /** other words people search for */
  words: readonly string[]
  when: When & { kinds: readonly GarmentKind[] }
  /** 'either': on both sides or on one; 'both': only ever on both or at the centre; 'one': a difference between left and right */
  sided: 'either' | 'both' | 'one'
  signs: readonly SignPattern[]
  measures: readonly MeasurePattern[]
  amounts: {
    /** + adds cloth (or raises, or moves out), − takes it away */
    direction: 1 | -1
    /** whole amounts for a slight, a clear and a strong sign where nothing was measured */
    usualMm: readonly [number, number, number]
  }
  change: {
    operation: Operation
    /** in working order; `when` chooses those that fit the garment */
    steps: readonly StepRule[]
    /** how the whole is shared between groups of steps; must sum to 1. Groups without steps for the garment give theirs to the others */
    parts?: Readonly<Record<string, number>>
    /** what follows on other pieces; empty only with a reason */
    companions: readonly CompanionRule[]
    noCompanions?: string
  }
  limits: {
    /** under it: leave it */
    leastMm: number
    mostMm: number
    /** what is better above `mostMm`, a sentence without the figure: "Take the next size, or …" */
    beyond: string
  }
  stage: Stage
  /** causes whose change does the exact opposite at the same place: the one overdone looks like the other */
  opposite?: Cause
  /** causes whose change undoes this one: both at once is a contradiction */
  conflictsWith?: readonly Cause[]
  /** later changes whose amount this one moves; `times` × this amount is added to theirs (signed), or it is asked again where left out */
  moves?: readonly { cause: Cause; times?: number; note: string }[]
  /** a place that keeps its measure where its ease is enough: body + ease ≤ finished → `kept`, else `short`; `unknown` where a measurement is missing */
  keeps?: { body: string; finished: string; easeMm: number; kept: string; short: string; unknown: string }
  /** what every observation it explains should read next time: "The fold is gone and the waistband lies level." */
  predicts: string
  recheck: readonly string[]
  /** publication and place, with the parts that are common practice named, or 'common practice' */
  source: string
  drawing: { sign: SignDrawing; change: ChangeDrawing }
} & ({ rivals: readonly [Rival, ...Rival[]]; noRivals?: never } | { rivals: readonly []; /** why nothing else looks like it */ noRivals: string })
