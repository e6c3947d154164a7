import type { AppraisalJob } from './appraisalJob'

/** A job and the firm it is done for. */
export interface Waiting {
  readonly job: Pick<AppraisalJob, 'kind'>
  readonly firmId: string
}

const isSent = ({ job }: Waiting): boolean => job.kind === 'sent'

/**
 * Place of the job that begins next, or -1. What is stored goes before what was sent, and files that were sent leave one thread to
 * the others; of the rest the firm goes first that has the fewest under way, then whoever came first.
 */
export function placeOfNext(waiting: readonly Waiting[], running: readonly Waiting[], threads: number): number {
  const isFull = running.filter(isSent).length >= Math.max(1, threads - 1)
  let best = -1
  let least = Infinity
  waiting.forEach((candidate, place) => {
    if (isSent(candidate) && isFull) return
    const underWay = running.filter(({ firmId }) => firmId === candidate.firmId).length
    const rank = (isSent(candidate) ? threads + 1 : 0) + underWay
    if (rank < least) [best, least] = [place, rank]
  })
  return best
}
