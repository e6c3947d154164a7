import { doReadingJob } from './doReadingJob'
import type { ReadingJob } from './tableReading'

/** Runs in a process of its own: one job in, one outcome out. It ends when its parent does. */
process.once('message', (job: ReadingJob) => {
  void doReadingJob(job).then((outcome) => process.send?.(outcome, () => process.exit(0)))
})
process.once('disconnect', () => process.exit(1))
process.send?.('ready')
