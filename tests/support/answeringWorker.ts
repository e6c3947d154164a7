import { appraiseInFull } from '#shared/appraise'
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

/** Puts the engine itself in place of the browser's workers, which jsdom lacks. */
export function answeringWorkers(): void {
  vi.stubGlobal('Worker', AnsweringWorker)
}
