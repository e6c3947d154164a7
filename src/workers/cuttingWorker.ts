import { type CuttingQuestion, plansOf } from '#shared/schedule/cutting/diameterPlans'

/** Cutting plans off the main thread: a message for each diameter. */
self.addEventListener('message', ({ data }: MessageEvent<CuttingQuestion>) => {
  for (const plan of plansOf(data)) self.postMessage(plan)
})
