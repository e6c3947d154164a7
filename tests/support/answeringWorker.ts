import { appraiseInFull } from '#shared/appraise'
import { vi } from 'vitest'
import type { AppraisalAnswer, AppraisalRequest } from '../../src/workers/appraisalAnswer'
import { appraiseWhatStands } from '../../src/workers/appraiseWhatStands'

/** A worker that runs the engine at once, as the browser's does off the main thread. */
class AnsweringWorker extends EventTarget {
  postMessage({ id, file, origin }: AppraisalRequest): void {
    const data: AppraisalAnswer = { id, ...appraiseWhatStands(appraiseInFull, { file, origin }) }
    queueMicrotask(() => this.dispatchEvent(new MessageEvent('message', { data })))
  }
}

/** Puts the engine itself in place of the browser's workers, which jsdom lacks. */
export function answeringWorkers(): void {
  vi.stubGlobal('Worker', AnsweringWorker)
}
