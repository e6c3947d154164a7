const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' })
const dayUtc = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })
const time = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' })

/** A moment as its day, '14 March 2026'; an ISO date without a time stays that day everywhere. */
export function formatDay(moment: string): string {
  return (moment.length === 10 ? dayUtc : day).format(new Date(moment))
}

/** Hour and minute, '10:42'. */
export function formatTime(moment: Date | string): string {
  return time.format(new Date(moment))
}

/** How long ago a day was, in words for the age of a price: 'today', '12 days old', '3 months old'. */
export function formatAge(isoDate: string, now: Date): string {
  const days = Math.floor((now.getTime() - new Date(isoDate).getTime()) / 86_400_000)
  if (days < 0) return 'for a day to come'
  if (days === 0) return 'of today'
  if (days < 60) return days === 1 ? '1 day old' : `${days} days old`
  const then = new Date(isoDate)
  const started = (now.getUTCFullYear() - then.getUTCFullYear()) * 12 + now.getUTCMonth() - then.getUTCMonth()
  const months = now.getUTCDate() < then.getUTCDate() ? started - 1 : started
  return months < 24 ? `${months} months old` : `${Math.floor(months / 12)} years old`
}
