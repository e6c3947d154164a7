import type { ApiIssue } from '#shared/contracts/apiError'
import { ref, shallowRef } from 'vue'
import type { FullAppraisal } from '#shared/appraise'
import type { Appraiser } from '../workers/appraiser'
import { createAppraiser } from '../workers/appraiser'
import type { AppraisalSource } from './appraisalFile'
import { toAppraisalFile } from './appraisalFile'

const PAUSE_MS = 80

/** Appraises a working copy whenever it changed, off the main thread; the last good result stands until the next one. */
export function createSheetAppraisal(source: () => AppraisalSource | null) {
  const full = shallowRef<FullAppraisal | null>(null)
  const problems = shallowRef<readonly ApiIssue[]>([])
  const isAppraising = ref(false)
  const fault = ref<string | null>(null)
  let appraiser: Appraiser | null = null
  let timer: ReturnType<typeof setTimeout> | undefined
  let leftOut: readonly ApiIssue[] = []

  function start(): Appraiser {
    return createAppraiser(
      (answer) => {
        isAppraising.value = false
        fault.value = null
        problems.value = [...leftOut, ...answer.problems]
        full.value = answer.full
      },
      (message) => {
        isAppraising.value = false
        fault.value = message
      },
    )
  }

  function ask(): void {
    const given = source()
    if (given === null) return
    const { file, origin, problems: refused } = toAppraisalFile(given)
    leftOut = refused
    appraiser ??= start()
    if (file !== null) return appraiser.ask(file, origin)
    appraiser.drop()
    isAppraising.value = false
    problems.value = refused
    if (given.levels.every(({ panels }) => panels.length === 0) || given.schemes.length === 0) full.value = null
  }

  function schedule(pause = PAUSE_MS): void {
    clearTimeout(timer)
    isAppraising.value = true
    timer = setTimeout(ask, pause)
  }

  function reset(): void {
    clearTimeout(timer)
    appraiser?.drop()
    full.value = null
    problems.value = []
    fault.value = null
    isAppraising.value = false
  }

  return { full, problems, isAppraising, fault, schedule, reset }
}
