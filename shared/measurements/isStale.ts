/**
 * Whether a set of measurements is older than a month and due to be taken again. Common practice; extension services say half a
 * year at the latest, and at once when weight or figure changed.
 * @param takenOn - ISO date, 2026-10-31
 * @param today - ISO date; a month on from 31 October is 30 November, so the set is stale from 1 December
 */
export const isStale = (takenOn: string, today: string): boolean => monthLater(takenOn) < today

/** The same day a month on, or that month's last day. */
function monthLater(date: string): string {
  const [year, month, day] = date.split('-').map(Number) as [number, number, number]
  const lastDay = new Date(Date.UTC(year, month + 1, 0)).getUTCDate()
  return new Date(Date.UTC(year, month, Math.min(day, lastDay))).toISOString().slice(0, 10)
}

/** Whole days from one ISO date to another; negative when the other lies before. */
export const daysBetween = (from: string, to: string): number => Math.round((Date.parse(`${to}T00:00:00Z`) - Date.parse(`${from}T00:00:00Z`)) / 86_400_000)
