import { appraiseInFull } from '#shared/appraise'
import { type CuttingQuestion, plansOf } from '#shared/schedule/cutting/diameterPlans'
import { vi } from 'vitest'
import type { AppraisalAnswer, AppraisalRequest } from '../../src/workers/appraisalAnswer'
import { appraiseWhatStands } from '../../src/workers/appraiseWhatStands'
import { studied, type StudyRequest } from '../../src/workers/study'

function appraised({ id, file, origin }: AppraisalRequest): AppraisalAnswer {
  return { id, ...appraiseWhatStands(appraiseInFull, { file, origin }) }
}

/** A worker that runs the engine at once, as the browser's does off the main thread. */
class AnsweringWorker extends EventTarget {
  postMessage(request: AppraisalRequest | StudyRequest): void {
    const data = 'kind' in request ? studied(structuredClone(request)) : appraised(request)
    queueMicrotask(() => this.dispatchEvent(new MessageEvent('message', { data })))
  }

  terminate(): void {}
}

/** A worker that plans the cuts at once, a message for each diameter. */
class CuttingWorker extends EventTarget {
  private isRunning = true

  postMessage(question: CuttingQuestion): void {
    for (const data of plansOf(question))
      queueMicrotask(() => this.isRunning && this.dispatchEvent(new MessageEvent('message', { data })))
  }

  terminate(): void {
    this.isRunning = false
  }
}

/** Puts the engine itself in place of the browser's workers, which jsdom lacks. */
export function answeringWorkers(): void {
  vi.stubGlobal('Worker', function workerOf(url: URL) {
    return url.href.includes('cuttingWorker') ? new CuttingWorker() : new AnsweringWorker()
  })
}
