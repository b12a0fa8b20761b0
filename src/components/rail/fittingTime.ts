const dayMs = 24 * 3600 * 1000

/** When a fitting is, as people say it: "Today, 16:00", "Thursday, 16:00" within a week, "Thursday 3 December, 16:00" beyond. */
export function fittingTime(at: Date, now = new Date()): string {
  const midnight = (date: Date) => new Date(date.getFullYear(), date.getMonth(), date.getDate()).getTime()
  // Rounded, because a day on which the clocks change is not 24 hours long.
  const days = Math.round((midnight(at) - midnight(now)) / dayMs)
  const time = at.toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' })
  if (days === 0) return `Today, ${time}`
  if (days === 1) return `Tomorrow, ${time}`
  const near = days > 1 && days < 7
  return `${at.toLocaleDateString('en-GB', near ? { weekday: 'long' } : { weekday: 'long', day: 'numeric', month: 'long' })}, ${time}`
}
