import { describe, expect, it } from 'vitest'
import { garmentKinds, signs, zones } from '#shared/fit/types.ts'
import { bodyPaths, garmentPaths } from '../../../src/components/figure/figureShapes.ts'
import { bestView, zoneAt, zoneSpot } from '../../../src/components/figure/figureZones.ts'
import { strokePaths, strokesOf } from '../../../src/components/figure/signStrokes.ts'

describe('drawings of signs', () => {
  it('draws every sign at every zone on its best view', () => {
    for (const sign of signs) for (const zone of zones) {
      const strokes = strokesOf({ sign, zone, view: bestView(zone) })
      expect(strokes.length, `${sign} at ${zone}`).toBeGreaterThan(0)
      for (const { solid, dashed } of strokes.map(strokePaths)) expect(solid + dashed).not.toMatch(/NaN|undefined/)
    }
  })
  it('tells signs at one zone apart by their drawing', () => {
    const drawn = signs.map((sign) => JSON.stringify(strokesOf({ sign, zone: 'waist', view: 'front' })))
    expect(new Set(drawn).size).toBe(signs.length)
  })
  it('draws one side alone where one side is meant, the wearer’s left at the right of a front view', () => {
    const both = strokesOf({ sign: 'gaping', zone: 'armhole', view: 'front', side: 'both' })
    const left = strokesOf({ sign: 'gaping', zone: 'armhole', view: 'front', side: 'left' })
    expect(both).toHaveLength(2)
    expect(left).toHaveLength(1)
    expect(left[0]!.points[0]![0]).toBeGreaterThan(100)
    expect(strokesOf({ sign: 'gaping', zone: 'armhole', view: 'back', side: 'left' })[0]!.points[0]![0]).toBeLessThan(100)
  })
  it('does not draw what a view cannot show', () => expect(strokesOf({ sign: 'tight', zone: 'seat', view: 'front' })).toEqual([]))
  it('dresses the figure in every kind of garment from every side', () => {
    for (const kind of [null, ...garmentKinds]) for (const view of ['front', 'back', 'side'] as const) {
      const { shapes, seams } = garmentPaths(view, kind)
      expect(shapes.length).toBeGreaterThan(0)
      expect([...shapes, ...seams, ...bodyPaths(view).lines].join('')).not.toMatch(/NaN|undefined/)
    }
  })
  it('puts the hem where the garment ends', () => {
    expect(zoneSpot('hem', 'front', 'bodice')!.y).toBeLessThan(zoneSpot('hem', 'front', 'skirt')!.y)
    expect(zoneSpot('hem', 'front', 'trousers')!.paired).toBe(true)
  })
  it('finds the zone a finger points at', () => {
    const allowed = zones.filter((zone) => zone !== 'whole')
    expect(zoneAt([100, 112], 'front', null, allowed)).toBe('bust')
    expect(zoneAt([52, 150], 'front', null, allowed)).toBe('sleeve')
    expect(zoneAt([100, 190], 'back', null, allowed)).toBe('seat')
  })
})
