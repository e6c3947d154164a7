import type { ApiIssue } from '#shared/contracts/apiError'
import { ref, shallowRef } from 'vue'
import type { FullAppraisal } from '#shared/appraise'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import type { Appraiser } from '../workers/appraiser'
import { createAppraiser } from '../workers/appraiser'
import type { AppraisalSource } from './appraisalFile'
import { toAppraisalFile } from './appraisalFile'

const PAUSE_MS = 80

/** Appraises a working copy whenever it changed, off the main thread; the last good result stands until the next one. */
export function createSheetAppraisal(source: () => AppraisalSource | null) {
  const full = shallowRef<FullAppraisal | null>(null)
  /** The file that `full` was made from. */
  const file = shallowRef<AppraisalFile | null>(null)
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
        file.value = answer.file
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
    const { file: asked, origin, problems: refused } = toAppraisalFile(given)
    leftOut = refused
    appraiser ??= start()
    if (asked !== null) return appraiser.ask(asked, origin)
    appraiser.drop()
    isAppraising.value = false
    problems.value = refused
    if (given.levels.every(({ panels }) => panels.length === 0) || given.schemes.length === 0) forget()
  }

  function forget(): void {
    full.value = null
    file.value = null
  }

  function schedule(pause = PAUSE_MS): void {
    clearTimeout(timer)
    isAppraising.value = true
    timer = setTimeout(ask, pause)
  }

  function reset(): void {
    clearTimeout(timer)
    appraiser?.drop()
    forget()
    problems.value = []
    fault.value = null
    isAppraising.value = false
  }

  return { full, file, problems, isAppraising, fault, schedule, reset }
}
