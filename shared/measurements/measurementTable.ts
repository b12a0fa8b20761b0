/**
 * Every body measurement the journal knows. Standard names after EN 13402-1 and ISO 8559-1; how to take each one is common practice in
 * our own words. Ranges: 5th to 95th percentile of the ANSUR II public data (1,986 women, 4,082 men, 2012), soldiers and therefore
 * fitter than the public; our own wide limits where that survey has nothing to compare.
 */
import { type Measurement, type Plausible, type TapeLine } from './measurement.ts'

/** Large girths 10 mm, small ones 5 mm, short lengths 5 mm: our own limits for a tape at home, near those of ISO 20685 for scans. */
const large = 10
const small = 5

const ring = (view: TapeLine['view'], x1: number, x2: number, y: number, dip = 6, rise = 0): TapeLine => {
  const middle = (x1 + x2) / 2
  return { view, path: `M${x1} ${y}Q${middle} ${y + dip} ${x2} ${y}`, behind: `M${x1} ${y}Q${middle} ${y - dip - rise} ${x2} ${y}` }
}
const straight = (view: TapeLine['view'], ...points: readonly (readonly [number, number])[]): TapeLine => ({ view, path: `M${points.map(([x, y]) => `${x} ${y}`).join('L')}` })

const survey = (women: [number, number] | null, men: [number, number] | null, note = ''): Plausible => {
  const known = [women, men].filter((range) => range !== null)
  return {
    leastMm: Math.min(...known.map(([least]) => least)), mostMm: Math.max(...known.map(([, most]) => most)),
    ...(women && { women: { p5Mm: women[0], p95Mm: women[1] } }), ...(men && { men: { p5Mm: men[0], p95Mm: men[1] } }),
    source: `ANSUR II public data, 5th to 95th percentile${note && `; ${note}`}`,
  }
}
const ours = (leastMm: number, mostMm: number): Plausible => ({ leastMm, mostMm, source: 'our own wide limits for adults' })

export const measurementTable = [
  {
    code: 'height', standardName: 'height', name: 'Height', aliases: ['stature', 'body height'], group: 'whole', kind: 'length', paired: false, toleranceMm: large,
    how: 'Without shoes, heels and back against a wall. Lay a book flat on the head, mark the wall under it, and measure from the floor to the mark.',
    tape: straight('front', [30, 12], [30, 386]), plausible: survey([1525, 1740], [1648, 1870]),
  },
  {
    code: 'neck', standardName: 'neck girth', name: 'Neck', aliases: ['neck base', 'neck base girth', 'neckline', 'collar'], group: 'neck-and-shoulder', kind: 'girth', paired: false, toleranceMm: small,
    how: 'Round the base of the neck, over the prominent bone at the back and just above the collar bones in front. For a collar with a stand, measure a little higher, with a finger under the tape, and say so in the note.',
    tape: ring('front', 90, 110, 60, 6), plausible: survey([340, 405], [395, 479], 'neck base'),
  },
  {
    code: 'shoulder', standardName: 'shoulder length', name: 'Shoulder', aliases: ['shoulder seam', 'shoulder length', 'single shoulder'], group: 'neck-and-shoulder', kind: 'length', paired: true, toleranceMm: small,
    how: 'From the side of the neck base, along the top of the shoulder, to the bone where the arm begins.',
    tape: straight('front', [110, 60], [134, 70]), plausible: survey([120, 153], [133, 167]),
  },
  {
    code: 'back-width', standardName: 'back width', name: 'Across back', aliases: ['back width', 'cross back', 'x back', 'across the back'], group: 'neck-and-shoulder', kind: 'width', paired: false, toleranceMm: large,
    how: 'Level across the back from arm crease to arm crease, half way down the armhole, arms hanging.',
    tape: straight('back', [69, 92], [131, 92]), plausible: survey([326, 423], [374, 491]),
  },
  {
    code: 'front-width', standardName: 'front width', name: 'Across front', aliases: ['across chest', 'front width', 'chest width', 'cross front', 'x front'], group: 'neck-and-shoulder', kind: 'width', paired: false, toleranceMm: large,
    how: 'Level across the front from arm crease to arm crease, half way down the armhole.',
    tape: straight('front', [70, 92], [130, 92]), plausible: ours(260, 480),
  },
  {
    code: 'armscye-depth', standardName: 'scye depth', name: 'Armhole depth', aliases: ['armscye', 'scye depth', 'armscye depth'], group: 'neck-and-shoulder', kind: 'length', paired: false, toleranceMm: small,
    how: 'Tie a tape level under both arms. Measure down the middle of the back from the prominent neck bone to the top of that tape.',
    tape: straight('back', [100, 57], [100, 104]), plausible: ours(150, 300),
  },
  {
    code: 'bust', standardName: 'bust girth', name: 'Full bust', aliases: ['bust', 'bust girth', 'bust circumference'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'Over the fullest part of the bust, the tape level all round and just touching, breathing normally, in the bra the garment is worn with.',
    tape: ring('front', 67, 133, 112, 8), plausible: survey([824, 1094], null),
  },
  {
    code: 'high-bust', standardName: null, name: 'High bust', aliases: ['upper bust', 'above bust'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'Close under the arms and above the fullness of the bust, across the widest part of the back. The tape slopes up at the back; pull it snug.',
    tape: ring('front', 67, 133, 102, 4, 8), plausible: ours(700, 1250),
  },
  {
    code: 'chest', standardName: 'chest girth', name: 'Chest', aliases: ['chest girth', 'chest circumference'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'Level over the shoulder blades, close under the arms and across the widest part of the chest, arms hanging, breathing normally.',
    tape: ring('front', 67, 133, 108, 7), plausible: survey(null, [922, 1207]),
  },
  {
    code: 'underbust', standardName: 'underbust girth', name: 'Underbust', aliases: ['under bust', 'rib', 'ribcage', 'rib cage'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'Level round the ribs, directly under the bust.', tape: ring('front', 70, 130, 124, 7), plausible: ours(620, 1200),
  },
  {
    code: 'bust-depth', standardName: 'neck shoulder to breast point', name: 'Bust depth', aliases: ['shoulder to bust', 'bust point depth', 'apex depth'], group: 'trunk', kind: 'length', paired: true, toleranceMm: small,
    how: 'From the side of the neck base down to the fullest point of the bust.', tape: straight('front', [110, 60], [115, 112]), plausible: ours(180, 420),
  },
  {
    code: 'bust-span', standardName: 'bust point to bust point', name: 'Bust span', aliases: ['bust point distance', 'apex to apex', 'bust separation'], group: 'trunk', kind: 'width', paired: false, toleranceMm: small,
    how: 'Straight across from one fullest point of the bust to the other.', tape: straight('front', [85, 112], [115, 112]), plausible: ours(130, 300),
  },
  {
    code: 'front-waist-length', standardName: 'neck shoulder over breast point to waist', name: 'Front waist length', aliases: ['front waist', 'front bodice length', 'neck to waist front'], group: 'trunk', kind: 'length', paired: true, toleranceMm: small,
    how: 'From the side of the neck base, over the fullest point of the bust, down to the tape tied at the waist.', tape: straight('front', [110, 60], [115, 112], [113, 148]), plausible: ours(350, 560),
  },
  {
    code: 'back-waist-length', standardName: 'back waist length', name: 'Back waist length', aliases: ['back waist', 'nape to waist', 'neck to waist', 'neck to waist back', 'back neck to waist'], group: 'trunk', kind: 'length', paired: false, toleranceMm: small,
    how: 'Someone else measures: from the prominent bone at the back of the neck, straight down to the tape tied at the waist.',
    tape: straight('back', [100, 57], [100, 147]), plausible: survey([384, 470], [433, 524], 'taken there to navel level, which lies lower'),
  },
  {
    code: 'waist', standardName: 'waist girth', name: 'Waist', aliases: ['waist girth', 'natural waist', 'waist circumference'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'Tie a tape or narrow elastic round the middle and bend to the sides: it settles at the natural waist. Measure there, level, without pulling in.',
    tape: ring('front', 74.5, 125.5, 147, 7), plausible: survey([710, 1040], [768, 1131], 'taken there at navel level, which is usually larger'),
  },
  {
    code: 'waist-seated', standardName: null, name: 'Waist, seated', aliases: ['seated waist', 'sitting waist'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'As the waist, sitting upright on a flat chair. For skirts and trousers of cloth that does not stretch, the larger of both counts.',
    tape: ring('front', 74.5, 125.5, 147, 7), plausible: ours(640, 1250),
  },
  {
    code: 'abdomen', standardName: null, name: 'High hip', aliases: ['abdomen', 'upper hip', 'high hip girth', 'tummy', 'belly'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'Level over the fullest part of the abdomen, usually 8 to 10 cm (3 to 4 in) below the waist.', tape: ring('front', 70.5, 129.5, 167, 7), plausible: ours(700, 1300),
  },
  {
    code: 'hip', standardName: 'hip girth', name: 'Full hip', aliases: ['hip', 'hips', 'hip girth', 'seat', 'seat girth', 'low hip', 'hip circumference'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'Level over the fullest part of the seat, seen from the side, feet together. Note how far below the waist that is.', tape: ring('front', 64.5, 135.5, 196, 8), plausible: survey([901, 1156], [899, 1149]),
  },
  {
    code: 'hip-seated', standardName: null, name: 'Hip, seated', aliases: ['seated hip', 'sitting hip'], group: 'trunk', kind: 'girth', paired: false, toleranceMm: large,
    how: 'Round the fullest part of seat and thighs, sitting on a flat chair. For skirts and trousers of cloth that does not stretch, the larger of both counts.',
    tape: ring('front', 64.5, 135.5, 196, 8), plausible: ours(850, 1400),
  },
  {
    code: 'waist-to-hip', standardName: 'waist to hips', name: 'Hip depth', aliases: ['waist to hip', 'hip depth', 'waist to hip depth'], group: 'trunk', kind: 'length', paired: true, toleranceMm: small,
    how: 'Along the side, from the tape at the waist to the tape at the full hip.', tape: straight('side', [100, 147], [100, 196]), plausible: ours(140, 280),
  },
  {
    code: 'head', standardName: 'head girth', name: 'Head', aliases: ['head girth', 'head circumference'], group: 'neck-and-shoulder', kind: 'girth', paired: false, toleranceMm: small,
    how: 'Round the widest part of the head, above the ears. A neck opening without a fastening must pass it.', tape: ring('front', 86, 114, 24, 5), plausible: ours(500, 640),
  },
  {
    code: 'upper-arm', standardName: 'upper arm girth', name: 'Upper arm', aliases: ['biceps', 'bicep', 'upper arm girth', 'arm girth'], group: 'arm', kind: 'girth', paired: true, toleranceMm: small,
    how: 'Round the fullest part of the arm above the elbow, the arm hanging relaxed.', tape: ring('front', 133.5, 144, 104, 3), plausible: survey([259, 360], [303, 418], 'taken there with the arm flexed, which is larger'),
  },
  {
    code: 'elbow', standardName: 'elbow girth', name: 'Elbow', aliases: ['elbow girth'], group: 'arm', kind: 'girth', paired: true, toleranceMm: small,
    how: 'Round the elbow with the arm bent.', tape: ring('front', 138, 148, 136, 3), plausible: ours(210, 380),
  },
  {
    code: 'wrist', standardName: 'wrist girth', name: 'Wrist', aliases: ['wrist girth'], group: 'arm', kind: 'girth', paired: true, toleranceMm: small,
    how: 'Round the wrist, over the bone.', tape: ring('front', 149, 158, 190, 3), plausible: survey([142, 168], [162, 191]),
  },
  {
    code: 'hand', standardName: 'hand girth', name: 'Hand', aliases: ['hand girth'], group: 'arm', kind: 'girth', paired: true, toleranceMm: small,
    how: 'Round the knuckles with the thumb laid into the palm. A cuff without a fastening must pass it.', tape: ring('front', 150, 159, 203, 3), plausible: ours(170, 270),
  },
  {
    code: 'arm-length', standardName: 'arm length', name: 'Arm length', aliases: ['sleeve', 'sleeve length', 'shoulder to wrist'], group: 'arm', kind: 'length', paired: true, toleranceMm: small,
    how: 'From the bone where the arm begins, over the bent elbow, to the wrist bone.', tape: straight('front', [134, 71], [143, 104], [148, 136], [158, 190]), plausible: survey([497, 594], [545, 645]),
  },
  {
    code: 'crotch-depth', standardName: 'body rise', name: 'Crotch depth', aliases: ['rise', 'body rise', 'depth of crotch'], group: 'leg', kind: 'length', paired: false, toleranceMm: small,
    how: 'Sitting upright on a hard flat chair: along the side, from the tape at the waist to the seat.', tape: { view: 'side', path: 'M100 147L100 214M84 214L117 214' }, plausible: ours(200, 380),
  },
  {
    code: 'crotch-length', standardName: 'total crotch length', name: 'Crotch length', aliases: ['crotch length', 'total crotch', 'trunk rise'], group: 'leg', kind: 'length', paired: false, toleranceMm: large,
    how: 'From the waist tape in front, between the legs, to the waist tape at the back, close but not tight.',
    tape: { view: 'side', path: 'M84 147L80 178Q84 214 100 216Q121 214 124 190Q120 168 113 148' }, plausible: ours(520, 950),
  },
  {
    code: 'crotch-front', standardName: null, name: 'Crotch length, front', aliases: ['front crotch', 'front rise', 'front crotch length'], group: 'leg', kind: 'length', paired: false, toleranceMm: small,
    how: 'The front part of the crotch length: from the waist tape to the middle between the legs.', tape: { view: 'side', path: 'M84 147L80 178Q84 214 100 216' }, plausible: ours(220, 460),
  },
  {
    code: 'crotch-back', standardName: null, name: 'Crotch length, back', aliases: ['back crotch', 'back rise', 'back crotch length'], group: 'leg', kind: 'length', paired: false, toleranceMm: small,
    how: 'The back part of the crotch length: from the middle between the legs to the waist tape.', tape: { view: 'side', path: 'M100 216Q121 214 124 190Q120 168 113 148' }, plausible: ours(260, 520),
  },
  {
    code: 'thigh', standardName: 'thigh girth', name: 'Thigh', aliases: ['thigh girth', 'upper thigh'], group: 'leg', kind: 'girth', paired: true, toleranceMm: large,
    how: 'Level round the leg just below the crotch.', tape: ring('front', 101.5, 134.5, 220, 5), plausible: survey([527, 711], [532, 723]),
  },
  {
    code: 'knee', standardName: 'knee girth', name: 'Knee', aliases: ['knee girth'], group: 'leg', kind: 'girth', paired: true, toleranceMm: small,
    how: 'Round the middle of the knee, the leg slightly bent.', tape: ring('front', 106.5, 126, 286, 4), plausible: ours(310, 500),
  },
  {
    code: 'calf', standardName: 'calf girth', name: 'Calf', aliases: ['calf girth'], group: 'leg', kind: 'girth', paired: true, toleranceMm: small,
    how: 'Level round the fullest part of the lower leg.', tape: ring('front', 107, 124.5, 318, 4), plausible: survey([328, 423], [346, 443]),
  },
  {
    code: 'ankle', standardName: 'ankle girth', name: 'Ankle', aliases: ['ankle girth'], group: 'leg', kind: 'girth', paired: true, toleranceMm: small,
    how: 'Round the leg over the ankle bones.', tape: ring('front', 106, 116.5, 364, 3), plausible: ours(190, 310),
  },
  {
    code: 'instep', standardName: null, name: 'Heel over instep', aliases: ['heel instep', 'heel and instep', 'instep'], group: 'leg', kind: 'girth', paired: true, toleranceMm: small,
    how: 'Round the heel and over the instep with the foot pointed. A narrow trouser hem without a fastening must pass it.', tape: straight('side', [108, 384], [93, 366]), plausible: ours(270, 400),
  },
  {
    code: 'inside-leg', standardName: 'inside leg length', name: 'Inseam', aliases: ['inside leg', 'inseam', 'inside leg length', 'inleg'], group: 'leg', kind: 'length', paired: true, toleranceMm: large,
    how: 'From the crotch straight down the inside of the leg to the floor, or to where the hem is to be; say which.', tape: straight('front', [101, 212], [106, 384]), plausible: survey([712, 857], [771, 925], 'crotch to floor'),
  },
  {
    code: 'outside-leg', standardName: 'outside leg length', name: 'Side length', aliases: ['outseam', 'outside leg', 'waist to floor', 'side length', 'outside leg length'], group: 'leg', kind: 'length', paired: true, toleranceMm: large,
    how: 'Along the side, from the waist tape over the hip to the floor, in the shoes worn with the garment if they matter.', tape: straight('front', [125.5, 147], [130, 166], [135.5, 200], [133, 240], [126, 286], [125, 314], [117, 366], [117, 384]), plausible: ours(850, 1250),
  },
  {
    code: 'waist-to-knee', standardName: null, name: 'Waist to knee', aliases: ['waist to knee'], group: 'leg', kind: 'length', paired: false, toleranceMm: large,
    how: 'Along the side, from the waist tape to the middle of the knee.', tape: straight('front', [125.5, 147], [130, 166], [135.5, 200], [133, 240], [126, 286]), plausible: ours(480, 720),
  },
  {
    code: 'foot', standardName: 'foot length', name: 'Foot', aliases: ['foot length'], group: 'leg', kind: 'length', paired: true, toleranceMm: small,
    how: 'Standing on paper: from the back of the heel to the tip of the longest toe.', tape: straight('side', [78, 388], [108, 388]), plausible: ours(200, 320),
  },
] as const satisfies readonly Measurement[]

export type MeasurementCode = (typeof measurementTable)[number]['code']
