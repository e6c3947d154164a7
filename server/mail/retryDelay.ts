/** How often a mail is tried, and how long it rests between tries: 10 s, then four times longer each time, at most 2 hours. */
export interface RetryPlan {
  readonly mostTries: number
  readonly firstMs: number
  readonly growth: number
  readonly mostMs: number
}

export const RETRY_PLAN: RetryPlan = { mostTries: 8, firstMs: 10_000, growth: 4, mostMs: 7_200_000 }

/**
 * Rest after the given number of tries, ms, lengthened or shortened by up to a fifth so that mails do not come back all at once.
 * @param tries - made so far, 1 or more
 * @param random - between 0 and 1
 */
export function retryDelayMs(tries: number, plan: RetryPlan = RETRY_PLAN, random: number = Math.random()): number {
  const rest = Math.min(plan.mostMs, plan.firstMs * plan.growth ** (tries - 1))
  return Math.round(rest * (0.8 + 0.4 * random))
}
