import { type Garment } from '#shared/fit/types.ts'

/** Flat drawings on a 120 grid: `line` is drawn solid, `stitch` dashed. */
export type GarmentOutline = { line: readonly string[]; stitch: readonly string[] }

const outlines = {
  bodice: { line: ['M45 16c1 16 29 16 30 0l14 5c-2 11-1 20 6 27-2 14-4 24-9 34l4 22c-20 3-40 3-60 0l4-22c-5-10-7-20-9-34 7-7 8-16 6-27Z', 'M26.5 57l15-6M93.5 57l-15-6M47 105l2-36M73 105l-2-36M60 28v78'], stitch: ['M31 99c20 3 38 3 58 0'] },
  trousers: { line: ['M38 14h44l1 8H37Z', 'M37 22c-6 10-8 18-9 28l4 58h22l6-54 6 54h22l4-58c-1-10-3-18-9-28M60 14v40', 'M44 22c-1 8-5 14-13 16M76 22c1 8 5 14 13 16'], stitch: ['M32 103h22M66 103h22'] },
  skirt: { line: ['M38 20h44l1 8H37Z', 'M37 28c-7 10-10 20-11 32l4 42c20 3 40 3 60 0l4-42c-1-12-4-22-11-32', 'M48 28l2 18M72 28l-2 18M60 28v75'], stitch: ['M30 97c20 3 40 3 60 0'] },
  pullOnSkirt: { line: ['M38 18h44v10H38Z', 'M38 28c-8 14-14 40-16 74 25 5 51 5 76 0-2-34-8-60-16-74', 'M44 28c-1 10-2 16-4 26M52 28c-1 8-1 14-2 20M60 28v22M68 28c1 8 1 14 2 20M76 28c1 10 2 16 4 26M44 19v8M50 19v8M56 19v8M64 19v8M70 19v8M76 19v8'], stitch: ['M23 96c25 5 49 5 74 0'] },
  jacket: { line: ['M48 14l12 30 12-30 20 8 14 62-13 4-9-34-2 52H38l-2-52-9 34-13-4 14-62Z', 'M48 14l-8 16 8 4-4 6 16 24 16-24-4-6 8-4-8-16M60 64v42M40 84h13M67 84h13'], stitch: ['M16 79l12 4M104 79l-12 4'] },
  dress: { line: ['M46 12c4 8 24 8 28 0l11 5c-3 8-2 14 4 20-5 7-8 12-8 19l15 50c-24 5-48 5-72 0l15-50c0-7-3-12-8-19 6-6 7-12 4-20Z', 'M39 56c14 3 28 3 42 0M50 56l-2-16M70 56l2-16'], stitch: ['M25 101c23 5 47 5 70 0'] },
  shirt: { line: ['M48 14c4 6 20 6 24 0l20 9 14 44-14 5-8-22-1 55H37l-1-55-8 22-14-5 14-44Z', 'M48 14l4 12 8-6 8 6 4-12M60 20v85M64 34h12v14H64Z'], stitch: ['M36 99h48M17 62l13 5M103 62l-13 5'] },
  coat: { line: ['M48 10l12 26 12-26 20 8 13 56-13 4-8-28 4 60H32l4-60-8 28-13-4 13-56Z', 'M48 10l-10 14 9 5-3 7 16 20 16-20-3-7 9-5-10-14M60 56v54M38 76h13M69 76h13'], stitch: ['M33 104h54M17 69l12 4M103 69l-12 4'] },
} as const satisfies Record<string, GarmentOutline>

/** The flat drawing that stands for a garment until a photograph does. */
export function outlineOf(garment: Garment): GarmentOutline {
  if (garment.kind === 'skirt') return garment.waist === 'elastic' ? outlines.pullOnSkirt : outlines.skirt
  return outlines[garment.kind]
}
