import type { Ref, ShallowRef } from 'vue'
import { ref, shallowRef, watch } from 'vue'
import { StudyRefused, useStudies } from '../workers/studies'
import type { StudyAnswers, StudyKind, StudyQuestions } from '../workers/study'

export interface Study<Answer> {
  readonly answer: ShallowRef<Answer | null>
  readonly running: Ref<boolean>
  /** Why there is no answer, in words. */
  readonly problem: Ref<string | null>
}

/** An answer that is worked out off the main thread whenever its question changed; null asks nothing. Only the latest counts. */
export function useStudy<Kind extends StudyKind>(
  kind: Kind,
  question: () => StudyQuestions[Kind] | null,
): Study<StudyAnswers[Kind]> {
  const answer = shallowRef(null) as ShallowRef<StudyAnswers[Kind] | null> // nothing yet, of the kind that is asked
  const running = ref(false)
  const problem = ref<string | null>(null)
  let latest = 0

  async function ask(asked: StudyQuestions[Kind] | null): Promise<void> {
    latest += 1
    const mine = latest
    running.value = asked !== null
    problem.value = null
    if (asked === null) {
      answer.value = null
      return
    }
    try {
      const found = await useStudies().ask(kind, asked)
      if (mine === latest) answer.value = found
    } catch (cause) {
      if (!(cause instanceof StudyRefused)) throw cause
      if (mine === latest) [answer.value, problem.value] = [null, cause.message]
    } finally {
      if (mine === latest) running.value = false
    }
  }

  watch(question, (asked) => void ask(asked), { immediate: true })
  return { answer, running, problem }
}
