import { vi } from 'vitest'
import type { AppraisalAnswer, AppraisalRequest } from '../../src/workers/appraisalAnswer'

/** Workers made since, each answering only when told to. */
export class StillWorker extends EventTarget {
  static readonly made: StillWorker[] = []
  readonly requests: AppraisalRequest[] = []

  constructor() {
    super()
    StillWorker.made.push(this)
  }

  postMessage(request: AppraisalRequest): void {
    this.requests.push(request)
  }

  answer(answer: AppraisalAnswer): void {
    this.dispatchEvent(new MessageEvent('message', { data: answer }))
  }
}

/** Puts still workers in place of the browser's, which jsdom lacks. */
export function stillWorkers(): StillWorker[] {
  StillWorker.made.length = 0
  vi.stubGlobal('Worker', StillWorker)
  return StillWorker.made
}
