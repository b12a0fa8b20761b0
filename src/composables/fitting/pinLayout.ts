import { type Px } from './markGeometry.ts'

/**
 * Moves pins that would cover one another to a fan round the middle of their cluster.
 * @param anchors - where each pin would stand, screen pixels
 * @param apartPx - least distance of two pins
 * @returns the offset of each pin from its anchor; [0, 0] where it stands free
 */
export function fanOut(anchors: readonly Px[], apartPx: number): Px[] {
  const offsets: Px[] = anchors.map(() => [0, 0])
  const seen = new Set<number>()
  anchors.forEach((_, start) => {
    if (seen.has(start)) return
    const cluster = gather(anchors, start, apartPx, seen)
    if (cluster.length < 2) return
    const middle: Px = [mean(cluster.map((i) => anchors[i]![0])), mean(cluster.map((i) => anchors[i]![1]))]
    // Chord between neighbours on the ring is `apart`: r = apart / (2 sin(π/n)).
    const radius = cluster.length === 2 ? apartPx / 2 : apartPx / (2 * Math.sin(Math.PI / cluster.length))
    const startAngle = Math.atan2(anchors[cluster[0]!]![1] - middle[1], anchors[cluster[0]!]![0] - middle[0]) || -Math.PI / 2
    cluster.forEach((pin, i) => {
      const angle = startAngle + (i * 2 * Math.PI) / cluster.length
      offsets[pin] = [middle[0] + radius * Math.cos(angle) - anchors[pin]![0], middle[1] + radius * Math.sin(angle) - anchors[pin]![1]]
    })
  })
  return offsets
}

/** Pins reachable from one another in steps shorter than the least distance. */
function gather(anchors: readonly Px[], start: number, apartPx: number, seen: Set<number>): number[] {
  const cluster: number[] = []
  const waiting = [start]
  seen.add(start)
  while (waiting.length > 0) {
    const pin = waiting.pop()!
    cluster.push(pin)
    anchors.forEach((other, i) => {
      if (seen.has(i) || Math.hypot(other[0] - anchors[pin]![0], other[1] - anchors[pin]![1]) >= apartPx) return
      seen.add(i)
      waiting.push(i)
    })
  }
  return cluster.toSorted((a, b) => a - b)
}

const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length
