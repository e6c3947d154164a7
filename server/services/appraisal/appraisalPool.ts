import type { Appraisal, AppraisalFile } from '#shared/contracts/appraisal'
import { Worker } from 'node:worker_threads'
import { AppError } from '../../errors'
import type { AppraisalJob, AppraisalOutcome, ComparedAppraisal } from './appraisalJob'

export interface PoolBounds {
  readonly threads: number
  readonly waiting: number
  /** Longest appraisal; what takes longer is broken off. */
  readonly timeMs: number
}

const BOUNDS: PoolBounds = { threads: 2, waiting: 64, timeMs: 10_000 }
const MEMORY_MB = 512

/** Appraises in threads of its own, so that a heavy floor holds up nobody else's request. */
export interface AppraisalPool {
  /** A file as somebody sent it. @throws AppError `invalid_request` or `out_of_scope` with the issues, `too_large`, `unavailable` */
  appraiseSent(value: unknown): Promise<Appraisal>
  /** A file made from what is stored: schemes that cannot stand are left out. @throws AppError `too_large`, `unavailable` */
  appraiseStored(file: AppraisalFile): Promise<Appraisal>
  /** A file made from what is stored, every scheme of which must stand. @throws AppError as `appraiseSent` */
  appraiseCompared(file: AppraisalFile): Promise<ComparedAppraisal>
  close(): Promise<void>
}

interface Task {
  readonly job: AppraisalJob
  readonly resolve: (outcome: AppraisalOutcome) => void
  readonly reject: (error: Error) => void
}

const WORKER = new URL('./appraisalWorker.ts', import.meta.url).href
/** Threads do not take over how their process loads TypeScript: each is told so itself, and says when it is ready for work. */
const BEGIN = `
import('tsx/esm/api')
  .then(({ register }) => { register(); return import(${JSON.stringify(WORKER)}) })
  .then(() => require('node:worker_threads').parentPort.postMessage('ready'))`

function startWorker(): Worker {
  const worker = new Worker(BEGIN, { eval: true, resourceLimits: { maxOldGenerationSizeMb: MEMORY_MB } })
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
      return { appraisal: outcome.appraisal, cutPanels: [] }
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
  let sentRunning = 0

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

  /** Place of the first task that may begin: files that were sent leave one thread to the others. */
  function placeOfNext(): number {
    const isFull = sentRunning >= Math.max(1, bounds.threads - 1)
    return waiting.findIndex(({ job }) => job.kind !== 'sent' || !isFull)
  }

  function next(): void {
    const place = placeOfNext()
    if (place < 0) return
    if (idle.length === 0 && all.size < bounds.threads) start()
    const worker = idle.pop()
    if (worker) run(worker, waiting.splice(place, 1)[0]!)
  }

  function run(worker: Worker, { job, resolve, reject }: Task): void {
    const end = (settle: () => void, isSound: boolean) => {
      clearTimeout(late)
      if (job.kind === 'sent') sentRunning--
      quiet(worker)
      if (isSound) idle.push(worker)
      else drop(worker)
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
    if (job.kind === 'sent') sentRunning++
    worker.postMessage(job)
  }

  async function perform(job: AppraisalJob): Promise<ComparedAppraisal> {
    if (waiting.length >= bounds.waiting) throw new AppError('unavailable', 'Too many appraisals wait.', undefined, 5)
    const outcome = await new Promise<AppraisalOutcome>((resolve, reject) => {
      waiting.push({ job, resolve, reject })
      next()
    })
    return required(outcome)
  }

  return {
    appraiseSent: async (value) => (await perform({ kind: 'sent', value })).appraisal,
    appraiseStored: async (file) => (await perform({ kind: 'stored', file })).appraisal,
    appraiseCompared: (file) => perform({ kind: 'compared', file }),
    close: async () => {
      await Promise.all([...all].map((worker) => worker.terminate()))
    },
  }
}
