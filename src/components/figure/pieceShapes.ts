/**
 * Plain drawings of pattern pieces on a sheet of 300 × 420, drawn by us: what an instruction card shows where a project's piece has no
 * shape of its own. Half pieces lie with their fold or centre at the left. Not to measure; amounts on them are enlarged to be seen.
 */
import { type PieceRole } from '#shared/fit/types.ts'
import { type Pt } from './figureShapes.ts'

export type PieceEdge = { name: string; points: readonly Pt[]; curved?: boolean }
export type PieceShape = {
  /** clockwise from the top of the centre line; each edge ends where the next begins */
  edges: readonly PieceEdge[]
  darts: readonly { apex: Pt; feet: readonly [Pt, Pt] }[]
  grain: readonly [Pt, Pt]
  /** landmarks: bust point, heights of lines */
  apex?: Pt
  lines: Readonly<Record<string, number>>
  /** the edge on the fold, if it is cut so */
  fold?: string
}

const upperFront: PieceShape = {
  edges: [
    { name: 'neckline', points: [[60, 124], [92, 112], [114, 62]], curved: true }, { name: 'shoulder', points: [[114, 62], [204, 92]] },
    { name: 'armhole', points: [[204, 92], [194, 136], [202, 178], [242, 208]], curved: true }, { name: 'side seam', points: [[242, 208], [222, 364]] },
    { name: 'waist', points: [[222, 364], [140, 374], [60, 374]], curved: true }, { name: 'centre front', points: [[60, 374], [60, 124]] },
  ],
  darts: [{ apex: [158, 226], feet: [[238, 236], [235, 260]] }, { apex: [136, 248], feet: [[126, 374], [150, 373]] }],
  grain: [[92, 170], [92, 320]], apex: [138, 224], lines: { bust: 224, 'under the bust': 262, waist: 370, chest: 170, lengthen: 312 }, fold: 'centre front',
}
const upperBack: PieceShape = {
  edges: [
    { name: 'neckline', points: [[60, 78], [92, 76], [110, 58]], curved: true }, { name: 'shoulder', points: [[110, 58], [202, 88]] },
    { name: 'armhole', points: [[202, 88], [194, 136], [204, 180], [238, 208]], curved: true }, { name: 'side seam', points: [[238, 208], [218, 364]] },
    { name: 'waist', points: [[218, 364], [60, 368]] }, { name: 'centre back', points: [[60, 368], [60, 78]] },
  ],
  darts: [{ apex: [132, 224], feet: [[122, 367], [144, 366]] }], grain: [[90, 130], [90, 300]], lines: { 'upper back': 130, 'shoulder blade': 150, waist: 366, lengthen: 312, 'back waist': 330 }, fold: 'centre back',
}
const skirt = (centre: string): PieceShape => ({
  edges: [
    { name: 'waist', points: [[60, 62], [120, 60], [184, 50]], curved: true }, { name: 'side seam', points: [[184, 50], [214, 110], [224, 160], [228, 260], [230, 372]], curved: true },
    { name: 'hem', points: [[230, 372], [60, 376]] }, { name: centre, points: [[60, 376], [60, 62]] },
  ],
  darts: [{ apex: [122, 142], feet: [[112, 60], [132, 58]] }], grain: [[90, 150], [90, 310]], lines: { waist: 60, hip: 160, abdomen: 110, hem: 372, lengthen: 290 }, fold: centre,
})
const trousers = (centre: string, point: number): PieceShape => ({
  edges: [
    { name: 'waist', points: [[98, 54], [190, 44]] }, { name: 'side seam', points: [[190, 44], [216, 110], [220, 170], [208, 270], [204, 378]], curved: true },
    { name: 'hem', points: [[204, 378], [112, 378]] }, { name: 'inseam', points: [[112, 378], [104, 270], [point, 192]], curved: true },
    { name: 'crotch curve', points: [[point, 192], [(point + 92) / 2, 186], [90, 158], [92, 124]], curved: true }, { name: centre, points: [[92, 124], [98, 54]] },
  ],
  darts: [{ apex: [146, 118], feet: [[138, 50], [154, 48]] }], grain: [[158, 170], [158, 330]], lines: { waist: 50, hip: 150, crotch: 192, knee: 270, hem: 378, rise: 130, lengthen: 320, seat: 165 },
})
const sleeve: PieceShape = {
  edges: [
    { name: 'cap', points: [[38, 160], [80, 120], [108, 70], [150, 52], [194, 72], [222, 122], [262, 160]], curved: true }, { name: 'underarm seam', points: [[262, 160], [208, 376]] },
    { name: 'hem', points: [[208, 376], [92, 376]] }, { name: 'underarm seam back', points: [[92, 376], [38, 160]] },
  ],
  darts: [], grain: [[150, 110], [150, 330]], lines: { biceps: 160, elbow: 258, wrist: 376, lengthen: 300, cap: 110 },
}
const band = (height: number, edges: [string, string, string, string] = ['upper edge', 'end', 'lower edge', 'centre']): PieceShape => ({
  edges: [
    { name: edges[0], points: [[40, 210 - height], [262, 210 - height]] }, { name: edges[1], points: [[262, 210 - height], [262, 210 + height]] },
    { name: edges[2], points: [[262, 210 + height], [40, 210 + height]] }, { name: edges[3], points: [[40, 210 + height], [40, 210 - height]] },
  ],
  darts: [], grain: [[80, 210], [220, 210]], lines: { lengthen: 210 },
})
const panel = (centre: string): PieceShape => ({
  edges: [
    { name: 'armhole', points: [[110, 84], [128, 140], [206, 178]], curved: true }, { name: 'side seam', points: [[206, 178], [196, 374]] }, { name: 'waist', points: [[196, 374], [104, 374]] },
    { name: centre, points: [[104, 374], [86, 224], [110, 84]], curved: true },
  ],
  darts: [], grain: [[150, 190], [150, 330]], lines: { bust: 224, waist: 370, lengthen: 310 },
})
const collar: PieceShape = {
  edges: [
    { name: 'outer edge', points: [[40, 160], [150, 150], [272, 180]], curved: true }, { name: 'front end', points: [[272, 180], [252, 246]] },
    { name: 'neckline', points: [[252, 246], [150, 226], [40, 236]], curved: true }, { name: 'centre back', points: [[40, 236], [40, 160]] },
  ],
  darts: [], grain: [[60, 196], [60, 222]], lines: { lengthen: 200 }, fold: 'centre back',
}
const facing: PieceShape = {
  edges: [
    { name: 'neckline', points: [[60, 170], [110, 150], [140, 90]], curved: true }, { name: 'shoulder', points: [[140, 90], [200, 110]] },
    { name: 'outer edge', points: [[200, 110], [160, 210], [60, 240]], curved: true }, { name: 'centre front', points: [[60, 240], [60, 170]] },
  ],
  darts: [], grain: [[84, 180], [84, 226]], lines: { lengthen: 200 }, fold: 'centre front',
}
const yoke: PieceShape = {
  edges: [
    { name: 'neckline', points: [[60, 130], [96, 126], [112, 100]], curved: true }, { name: 'shoulder', points: [[112, 100], [222, 138]] }, { name: 'armhole', points: [[222, 138], [214, 200], [218, 236]], curved: true },
    { name: 'yoke seam', points: [[218, 236], [60, 244]] }, { name: 'centre back', points: [[60, 244], [60, 130]] },
  ],
  darts: [], grain: [[84, 150], [84, 226]], lines: { lengthen: 200 }, fold: 'centre back',
}

export const pieceShapes: Record<PieceRole, PieceShape> = {
  'skirt-front': skirt('centre front'), 'skirt-back': skirt('centre back'), 'trouser-front': trousers('centre front', 62), 'trouser-back': trousers('centre back', 34), 'bodice-front': upperFront, 'bodice-back': upperBack,
  'side-front': panel('princess seam'), 'side-back': panel('princess seam'), yoke, sleeve, 'under-sleeve': sleeve, cuff: band(46), collar, 'collar-stand': collar, waistband: band(26, ['upper edge', 'end', 'waist', 'centre back']),
  'neck-facing': facing, 'front-facing': facing, 'armhole-facing': facing, casing: band(22), pocket: band(80, ['opening', 'side', 'lower edge', 'side']), lining: skirt('centre back'), fly: band(60), belt: band(18), tier: band(70),
}
