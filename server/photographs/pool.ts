/** Runs at most so many pieces of work at once; the others wait their turn. */
export function makePool(size: number) {
  let running = 0
  const waiting: (() => void)[] = []
  return async function inTurn<T>(work: () => Promise<T>): Promise<T> {
    if (running >= size) await new Promise<void>((go) => { waiting.push(go) })
    running++
    try {
      return await work()
    } finally {
      running--
      waiting.shift()?.()
    }
  }
}

/** Decoding takes a core and up to a few hundred megabytes: two at a time, whatever is uploaded. */
export const decodeInTurn = makePool(2)
