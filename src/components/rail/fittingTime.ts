const dayMs = 24 * 3600 * 1000
// Written out: the browser's formatter takes longer to start on a phone than the whole rail takes to draw.
const weekdays = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday']
const months = ['January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December']

/** When a fitting is, as people say it: "Today, 16:00", "Thursday, 16:00" within a week, "Thursday 3 December, 16:00" beyond. */
export function fittingTime(at: Date, now = new Date()): string {
  const midnight = (date: Date) => new Date(date.getFullYear(), date.getMonth(), date.getDate()).getTime()
  // Rounded, because a day on which the clocks change is not 24 hours long.
  const days = Math.round((midnight(at) - midnight(now)) / dayMs)
  const weekday = weekdays[at.getDay()]
  const day = days === 0 ? 'Today' : days === 1 ? 'Tomorrow' : days > 1 && days < 7 ? weekday : `${weekday} ${at.getDate()} ${months[at.getMonth()]}`
  return `${day}, ${String(at.getHours()).padStart(2, '0')}:${String(at.getMinutes()).padStart(2, '0')}`
}
