import type { AppraisalAnswer, AppraisalRequest, FileOrigin } from './appraisalAnswer'
import type { AppraisalFile } from '#shared/contracts/appraisal'

export interface Appraiser {
  /** Asks for an appraisal; the latest request wins, earlier ones are never answered. */
  readonly ask: (file: AppraisalFile, origin: FileOrigin) => void
  /** Forgets every request made so far. */
  readonly drop: () => void
}

/** Runs the engine in a worker with at most one request under way and one waiting. */
export function createAppraiser(onAnswer: (answer: AppraisalAnswer) => void, onFault: (message: string) => void): Appraiser {
  const worker = new Worker(new URL('./appraisalWorker.ts', import.meta.url), { type: 'module' })
  let latest = 0
  let isBusy = false
  let waiting: AppraisalRequest | null = null

  function send(request: AppraisalRequest): void {
    isBusy = true
    worker.postMessage(request)
  }

  function sendWaiting(): void {
    isBusy = false
    if (waiting !== null) send(waiting)
    waiting = null
  }

  worker.addEventListener('message', ({ data }: MessageEvent<AppraisalAnswer>) => {
    sendWaiting()
    if (data.id === latest) onAnswer(data)
  })
  worker.addEventListener('error', ({ message }) => {
    sendWaiting()
    onFault(message)
  })

  return {
    ask(file, origin) {
      latest += 1
      const request = { id: latest, file, origin }
      if (isBusy) waiting = request
      else send(request)
    },
    drop() {
      latest += 1
      waiting = null
    },
  }
}
