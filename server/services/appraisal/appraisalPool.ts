import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { Appraisal } from '#shared/contracts/appraisalResult'
import { Worker } from 'node:worker_threads'
import { AppError } from '../../errors'
import type { AppraisalJob, AppraisalOutcome, ComparedAppraisal } from './appraisalJob'
import { placeOfNext } from './appraisalTurn'

export interface PoolBounds {
  readonly threads: number
  readonly waiting: number
  /** Of these, how many may be one firm's. */
  readonly waitingPerFirm: number
  /** Longest appraisal; what takes longer is broken off. */
  readonly timeMs: number
}

const BOUNDS: PoolBounds = { threads: 2, waiting: 64, waitingPerFirm: 16, timeMs: 10_000 }
const MEMORY_MB = 512

/**
 * Appraises in threads of its own, so that a heavy floor holds up nobody else's request; firms take turns. All throw AppError
 * `limited` when too many of the firm's wait, `unavailable` when too many of all wait.
 */
export interface AppraisalPool {
  /** A file as somebody sent it. @throws AppError `invalid_request` or `out_of_scope` with the issues, `too_large` */
  appraiseSent(firmId: string, value: unknown): Promise<Appraisal>
  /** A file made from what is stored: schemes that cannot stand are left out. @throws AppError `too_large` */
  appraiseStored(firmId: string, file: AppraisalFile): Promise<Appraisal>
  /** A file made from what is stored, every scheme of which must stand. @throws AppError as `appraiseSent` */
  appraiseCompared(firmId: string, file: AppraisalFile): Promise<ComparedAppraisal>
  close(): Promise<void>
}

interface Task {
  readonly job: AppraisalJob
  readonly firmId: string
  readonly resolve: (outcome: AppraisalOutcome) => void
  readonly reject: (error: Error) => void
}

const WORKER = new URL('./appraisalWorker.ts', import.meta.url).href
/** Threads do not take over how their process loads TypeScript: each is told so itself, and says when it is ready for work. */
const BEGIN = `
import('tsx/esm/api')
  .then(({ register }) => { register(); return import(${JSON.stringify(WORKER)}) })
  .then(() => require('node:worker_threads').parentPort.postMessage('ready'))`

/** Without our environment, which holds secrets that an appraisal has no use for. */
function startWorker(): Worker {
  const worker = new Worker(BEGIN, { eval: true, env: {}, resourceLimits: { maxOldGenerationSizeMb: MEMORY_MB } })
  worker.unref()
  return worker
}

/** Takes our listeners off, by name: the thread keeps listeners of its own, without which no message arrives. */
function quiet(worker: Worker): void {
  worker.removeAllListeners('message')
  worker.removeAllListeners('error')
}

/** What the outcome holds. @throws AppError where it holds the reasons why there is none */
function required(outcome: AppraisalOutcome): ComparedAppraisal {
  switch (outcome.kind) {
    case 'done':
      return { appraisal: outcome.appraisal, cutPanels: [], alsoCompared: [], scopeDifferences: [], calculations: [] }
    case 'compared':
      return outcome
    case 'refused':
      throw new AppError('invalid_request', undefined, outcome.issues)
    case 'outOfScope':
      throw new AppError('out_of_scope', undefined, outcome.issues)
    case 'fault':
      throw new Error(`The appraisal failed: ${outcome.text}`)
  }
}

/** Threads start with the first job and are kept; one that runs out of time or memory is replaced. */
export function createAppraisalPool(bounds: PoolBounds = BOUNDS): AppraisalPool {
  const idle: Worker[] = []
  const all = new Set<Worker>()
  const waiting: Task[] = []
  const running = new Set<Task>()
  let isClosed = false

  function drop(worker: Worker): void {
    all.delete(worker)
    void worker.terminate()
  }

  function start(): void {
    const worker = startWorker()
    all.add(worker)
    worker.once('message', () => {
      quiet(worker)
      idle.push(worker)
      next()
    })
    worker.once('error', (error) => {
      drop(worker)
      waiting.shift()?.reject(error)
      next()
    })
  }

  function next(): void {
    const place = placeOfNext(waiting, [...running], bounds.threads)
    if (place < 0) return
    if (idle.length === 0 && all.size < bounds.threads) start()
    const worker = idle.pop()
    if (worker) run(worker, waiting.splice(place, 1)[0]!)
  }

  /** A thread that was broken off is replaced at once: others wait for one that is ready, not for one that has yet to begin. */
  function replace(worker: Worker): void {
    drop(worker)
    if (!isClosed && all.size < bounds.threads) start()
  }

  function run(worker: Worker, task: Task): void {
    const { job, resolve, reject } = task
    const end = (settle: () => void, isSound: boolean) => {
      clearTimeout(late)
      running.delete(task)
      quiet(worker)
      if (isSound) idle.push(worker)
      else replace(worker)
      settle()
      next()
    }
    const tooMuch = (what: string) =>
      new AppError('too_large', `The appraisal takes more ${what} than allowed; give it less to do.`)
    const late = setTimeout(() => end(() => reject(tooMuch('time')), false), bounds.timeMs)
    worker.once('message', (outcome: AppraisalOutcome) => end(() => resolve(outcome), true))
    worker.once('error', (error: NodeJS.ErrnoException) => {
      end(() => reject(error.code === 'ERR_WORKER_OUT_OF_MEMORY' ? tooMuch('memory') : error), false)
    })
    running.add(task)
    worker.postMessage(job)
  }

  async function perform(firmId: string, job: AppraisalJob): Promise<ComparedAppraisal> {
    if (waiting.filter((task) => task.firmId === firmId).length >= bounds.waitingPerFirm)
      throw new AppError('limited', 'Too many appraisals of your firm wait. Try again shortly.', undefined, 5)
    if (waiting.length >= bounds.waiting) throw new AppError('unavailable', 'Too many appraisals wait.', undefined, 5)
    const outcome = await new Promise<AppraisalOutcome>((resolve, reject) => {
      waiting.push({ job, firmId, resolve, reject })
      next()
    })
    return required(outcome)
  }

  return {
    appraiseSent: async (firmId, value) => (await perform(firmId, { kind: 'sent', value })).appraisal,
    appraiseStored: async (firmId, file) => (await perform(firmId, { kind: 'stored', file })).appraisal,
    appraiseCompared: (firmId, file) => perform(firmId, { kind: 'compared', file }),
    close: async () => {
      isClosed = true
      await Promise.all([...all].map((worker) => worker.terminate()))
    },
  }
}
