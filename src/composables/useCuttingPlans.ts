import { onScopeDispose, ref, shallowRef, watch } from 'vue'
import type { CuttingQuestion, DiameterPlan } from '#shared/schedule/cutting/diameterPlans'

/**
 * Cutting plans worked out off the main thread whenever the wanted bars changed, diameter by diameter; null asks nothing. `stop` leaves
 * what is not done undone, `again` takes it up anew.
 */
export function useCuttingPlans(question: () => CuttingQuestion | null) {
  const plans = shallowRef<readonly DiameterPlan[]>([])
  const isRunning = ref(false)
  const isStopped = ref(false)
  const fault = ref<string | null>(null)
  let worker: Worker | null = null
  let asked = ''

  function drop(): void {
    worker?.terminate()
    worker = null
    isRunning.value = false
  }

  function start(wanted: CuttingQuestion): void {
    drop()
    ;[plans.value, isStopped.value, fault.value] = [[], false, null]
    if (wanted.wanted.length === 0) return
    isRunning.value = true
    worker = new Worker(new URL('../workers/cuttingWorker.ts', import.meta.url), { type: 'module' })
    worker.addEventListener('message', ({ data }: MessageEvent<DiameterPlan>) => {
      plans.value = [...plans.value, data]
      if (plans.value.length === wanted.wanted.length) drop()
    })
    worker.addEventListener('error', ({ message }) => {
      fault.value = message
      drop()
    })
    worker.postMessage(wanted)
  }

  function stop(): void {
    isStopped.value = true
    drop()
  }

  function again(): void {
    const wanted = question()
    if (wanted !== null) start(wanted)
  }

  watch(
    question,
    (wanted) => {
      const key = JSON.stringify(wanted)
      if (wanted === null || key === asked) return
      asked = key
      start(wanted)
    },
    { immediate: true },
  )
  onScopeDispose(drop)
  return { plans, isRunning, isStopped, fault, stop, again }
}
