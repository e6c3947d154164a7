import type { StudyAnswers, StudyKind, StudyQuestions, StudyReply } from './study'

/** Why a study gave no answer: the reason in words for the reader. */
export class StudyRefused extends Error {
  override readonly name = 'StudyRefused'
}

interface Waiting {
  readonly resolve: (answer: StudyAnswers[StudyKind]) => void
  readonly reject: (reason: Error) => void
}

/** Runs studies in a worker that starts with the first of them. */
function createStudies() {
  const waiting = new Map<number, Waiting>()
  let worker: Worker | null = null
  let latest = 0

  function start(): Worker {
    const started = new Worker(new URL('./studyWorker.ts', import.meta.url), { type: 'module' })
    started.addEventListener('message', ({ data }: MessageEvent<StudyReply>) => {
      const one = waiting.get(data.id)
      waiting.delete(data.id)
      if ('problem' in data) one?.reject(new StudyRefused(data.problem))
      else one?.resolve(data.answer)
    })
    started.addEventListener('error', ({ message }) => {
      for (const { reject } of waiting.values()) reject(new Error(message))
      waiting.clear()
      worker = null
    })
    return started
  }

  return {
    /** @throws StudyRefused with the reason in words; Error for a fault of the engine */
    ask<Kind extends StudyKind>(kind: Kind, question: StudyQuestions[Kind]): Promise<StudyAnswers[Kind]> {
      worker ??= start()
      latest += 1
      const id = latest
      const answer = new Promise<StudyAnswers[StudyKind]>((resolve, reject) => waiting.set(id, { resolve, reject }))
      worker.postMessage({ id, kind, ...question })
      return answer as Promise<StudyAnswers[Kind]> // the worker answers a kind with its own answer
    },
    /** Stops what is under way: nothing asked before is answered. */
    drop(): void {
      worker?.terminate()
      worker = null
      waiting.clear()
    },
  }
}

export type Studies = ReturnType<typeof createStudies>

let shared: Studies | null = null

/** The studies of this window. */
export function useStudies(): Studies {
  shared ??= createStudies()
  return shared
}
