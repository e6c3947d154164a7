import { AppError } from '../../errors'

/** Each holds a connection of the database while its floor is appraised: two at a time leave the others to everybody else. */
const PARALLEL = 2
const MOST_WAITING = 50

let running = 0
const waiting: (() => void)[] = []

/** What `work` yields, when its turn has come. @throws AppError `unavailable` when too many wait */
export async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= PARALLEL) {
    if (waiting.length >= MOST_WAITING) throw new AppError('unavailable', 'Too many comparisons are sent at once.', undefined, 5)
    await new Promise<void>((resolve) => waiting.push(resolve))
  } else {
    running += 1
  }
  try {
    return await work()
  } finally {
    const next = waiting.shift()
    if (next) next()
    else running -= 1
  }
}
