/** How often within which time. */
export interface AllowanceRule {
  readonly most: number
  readonly windowMs: number
}

/** Callers that are counted apart at once; beyond them all begin anew. */
const MOST_CALLERS = 10_000

/**
 * Counts within this process, for what may be lost at a restart.
 * @returns true for the first `most` times that the caller is named within `windowMs` of the first of them
 */
export function createAllowance({ most, windowMs }: AllowanceRule, now = Date.now): (caller: string) => boolean {
  const counted = new Map<string, { count: number; since: number }>()
  return (caller) => {
    const known = counted.get(caller)
    if (known && now() - known.since < windowMs) return ++known.count <= most
    if (counted.size >= MOST_CALLERS) counted.clear()
    counted.set(caller, { count: 1, since: now() })
    return true
  }
}
