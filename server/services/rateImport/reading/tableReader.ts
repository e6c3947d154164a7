import { fork, type ChildProcess } from 'node:child_process'
import { readFile } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'
import { z } from 'zod'
import { importedSheet } from '#shared/contracts/rateImport'
import type { ReadingJob, ReadingOutcome } from './tableReading'

/** What a reading process may take. */
export interface ReaderBounds {
  readonly timeMs: number
  readonly heapMb: number
  /** Of memory altogether, heap and buffers. */
  readonly memoryMb: number
  /** Processes at once; more jobs wait. */
  readonly processes: number
}

const BOUNDS: ReaderBounds = { timeMs: 60_000, heapMb: 768, memoryMb: 1200, processes: 2 }
const LOOK_EVERY_MS = 100
const PAGE_KB = 4
const TOO_MUCH = 'Reading the file took more than is allowed. Save only the list, without pictures and formats, and send that.'
const PROCESS = fileURLToPath(new URL('./readerProcess.ts', import.meta.url))
const LOADER = import.meta.resolve('tsx')

const outcomeSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('read'), sheets: z.array(importedSheet).max(100) }),
  z.strictObject({ kind: z.literal('unreadable'), reason: z.string().max(500) }),
])

/** Reads uploaded tables in processes of their own, which are killed when they take too long or too much. */
export interface TableReader {
  read(job: ReadingJob): Promise<ReadingOutcome>
  /** Kills what is being read. */
  close(): void
}

/** Without our environment, which holds secrets that reading has no use for. */
const start = ({ heapMb }: ReaderBounds): ChildProcess =>
  fork(PROCESS, {
    execArgv: [`--max-old-space-size=${heapMb}`, '--import', LOADER],
    env: {},
    stdio: ['ignore', 'ignore', 'ignore', 'ipc'],
  })

async function memoryMb(pid: number): Promise<number> {
  const pages = (await readFile(`/proc/${pid}/statm`, 'utf8')).split(' ')[1]
  return (Number(pages) * PAGE_KB) / 1024
}

/** Kills the process at its deadline, or once it takes too much memory; gives what stops the watch. */
function watch(child: ChildProcess, bounds: ReaderBounds): () => void {
  const kill = () => child.kill('SIGKILL')
  const deadline = setTimeout(kill, bounds.timeMs)
  const looking = setInterval(() => {
    // a process that has just ended has no size any more: its end is told by `exit`
    if (child.pid !== undefined) memoryMb(child.pid).then((mb) => mb > bounds.memoryMb && kill(), () => undefined) // prettier-ignore
  }, LOOK_EVERY_MS)
  return () => {
    clearTimeout(deadline)
    clearInterval(looking)
  }
}

async function readApart(job: ReadingJob, bounds: ReaderBounds, running: Set<ChildProcess>): Promise<ReadingOutcome> {
  const child = start(bounds)
  running.add(child)
  const unwatch = watch(child, bounds)
  try {
    return await new Promise<ReadingOutcome>((resolve, reject) => {
      child.on('message', (message) => {
        if (message === 'ready') return void child.send(job)
        const outcome = outcomeSchema.safeParse(message)
        resolve(outcome.success ? outcome.data : { kind: 'unreadable', reason: TOO_MUCH })
      })
      child.once('error', reject)
      child.once('exit', () => resolve({ kind: 'unreadable', reason: TOO_MUCH }))
    })
  } finally {
    unwatch()
    running.delete(child)
    child.kill('SIGKILL')
  }
}

/** A reader that starts a process for each file, so that no file meets another. */
export function createTableReader(bounds: ReaderBounds = BOUNDS): TableReader {
  const running = new Set<ChildProcess>()
  const waiting: (() => void)[] = []
  let isClosed = false
  let busy = 0
  async function turn(): Promise<void> {
    if (busy >= bounds.processes) await new Promise<void>((resolve) => waiting.push(resolve))
    else busy += 1
  }
  function next(): void {
    const first = waiting.shift()
    if (first) first()
    else busy -= 1
  }
  return {
    async read(job) {
      await turn()
      try {
        if (isClosed) return { kind: 'unreadable', reason: 'The server was stopped while it read the file. Send it again.' }
        return await readApart(job, bounds, running)
      } finally {
        next()
      }
    },
    close() {
      isClosed = true
      for (const child of running) child.kill('SIGKILL')
    },
  }
}
