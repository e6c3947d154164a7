/** A day as ISO date, or null where the text is none that leaves no doubt. */
export function readDay(text: string): string | null {
  const iso = /^(\d{4})-(\d{1,2})-(\d{1,2})(?:[T ].*)?$/.exec(text)
  if (iso) return isoDay(Number(iso[1]), Number(iso[2]), Number(iso[3]))
  const dotted = /^(\d{1,2})\.(\d{1,2})\.(\d{4})$/.exec(text)
  if (dotted) return isoDay(Number(dotted[3]), Number(dotted[2]), Number(dotted[1]))
  const slashed = /^(\d{1,2})[/-](\d{1,2})[/-](\d{4})$/.exec(text)
  if (!slashed) return null
  const [first, second, year] = [Number(slashed[1]), Number(slashed[2]), Number(slashed[3])]
  if (first > 12 || first === second) return isoDay(year, second, first)
  return second > 12 ? isoDay(year, first, second) : null
}

function isoDay(year: number, month: number, day: number): string | null {
  const date = new Date(Date.UTC(year, month - 1, day))
  const isReal = date.getUTCFullYear() === year && date.getUTCMonth() === month - 1 && date.getUTCDate() === day
  return isReal ? date.toISOString().slice(0, 10) : null
}
