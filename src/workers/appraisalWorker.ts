import { appraiseInFull } from '#shared/appraise'
import type { AppraisalAnswer, AppraisalRequest } from './appraisalAnswer'
import { appraiseWhatStands } from './appraiseWhatStands'

/** The engine off the main thread: one answer to each request. */
self.addEventListener('message', ({ data }: MessageEvent<AppraisalRequest>) => {
  const answer: AppraisalAnswer = { id: data.id, ...appraiseWhatStands(appraiseInFull, data) }
  self.postMessage(answer)
})
