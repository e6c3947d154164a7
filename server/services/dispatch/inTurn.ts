import { AppError } from '../../errors'

/** Each holds a connection of the database while its floor is appraised: two at a time leave the others to everybody else. */
const PARALLEL = 2
const MOST_WAITING = 200
const MOST_WAITING_PER_FIRM = 50

interface Turn {
  readonly firmId: string
  readonly begin: () => void
}

const running: string[] = []
const waiting: Turn[] = []

/** Takes the turn of the firm that has none under way, else of whoever came first, out of the queue. */
function takeNext(): Turn | undefined {
  const place = waiting.findIndex(({ firmId }) => !running.includes(firmId))
  return waiting.splice(Math.max(0, place), 1)[0]
}

function beginNext(): void {
  if (running.length >= PARALLEL) return
  const turn = takeNext()
  if (!turn) return
  running.push(turn.firmId)
  turn.begin()
}

/**
 * What `work` yields, when its turn has come; firms take turns.
 * @throws AppError `limited` when too many of the firm wait, `unavailable` when too many of all do
 */
export async function inTurn<T>(firmId: string, work: () => Promise<T>): Promise<T> {
  if (waiting.filter((turn) => turn.firmId === firmId).length >= MOST_WAITING_PER_FIRM)
    throw new AppError('limited', 'Too many comparisons of your firm are sent at once. Try again shortly.', undefined, 5)
  if (waiting.length >= MOST_WAITING) throw new AppError('unavailable', 'Too many comparisons are sent at once.', undefined, 5)
  await new Promise<void>((begin) => {
    waiting.push({ firmId, begin })
    beginNext()
  })
  try {
    return await work()
  } finally {
    running.splice(running.indexOf(firmId), 1)
    beginNext()
  }
}
