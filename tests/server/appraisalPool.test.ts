import { afterEach, describe, expect, it } from 'vitest'
import type { AppError } from '../../server/errors'
import { createAppraisalPool, type AppraisalPool, type PoolBounds } from '../../server/services/appraisal/appraisalPool'
import { placeOfNext } from '../../server/services/appraisal/appraisalTurn'
import { appraisalFile } from '../../shared/contracts/appraisal'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../support/sampleProject'

let pool: AppraisalPool
afterEach(() => pool.close())
const open = (bounds: Partial<PoolBounds>) =>
  (pool = createAppraisalPool({ threads: 1, waiting: 50, waitingPerFirm: 50, timeMs: 20_000, ...bounds }))

/** A file of `count` panels side by side. */
function fileOf(count: number) {
  const [panel] = sampleLevel().panels
  const panels = Array.from({ length: count }, (_, place) => ({
    ...panel!,
    mark: `P${place}`,
    outline: panel!.outline.map(([x, y]) => [x + 6000 * place, y]),
  }))
  return appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief: sampleProject().brief,
    levels: [{ mark: 'L1', repeat: 1, panels }],
    schemes: [sampleRibbed().specification, sampleSolid().specification],
  })
}
const codeOf = (work: Promise<unknown>) =>
  work.then(
    () => 'done',
    (error: AppError) => error.code,
  )

describe('the threads that appraise', () => {
  it('leave the rest of the server free while they work', async () => {
    open({})
    await pool.appraiseSent('a', {}).catch(() => undefined)
    let longestMs = 0
    let last = performance.now()
    const watch = setInterval(() => {
      longestMs = Math.max(longestMs, performance.now() - last)
      last = performance.now()
    }, 5)
    const begun = performance.now()
    await pool.appraiseSent('a', fileOf(100))
    const tookMs = performance.now() - begun
    clearInterval(watch)
    expect(longestMs).toBeLessThan(Math.max(200, tookMs / 2))
  })

  it('break off what takes too long, and go on with the next', async () => {
    open({ timeMs: 400 })
    await pool.appraiseSent('a', {}).catch(() => undefined)
    const heavy = { ...fileOf(160), schemes: Array.from({ length: 20 }, (_, run) => sampleRibbed(`R${run}`).specification) }
    const answers = [codeOf(pool.appraiseSent('a', heavy)), codeOf(pool.appraiseSent('a', {}))]
    expect(await Promise.all(answers)).toEqual(['too_large', 'invalid_request'])
    expect(await codeOf(pool.appraiseSent('a', {}))).toBe('invalid_request')
  })

  it('leave one thread to stored projects while heavy files are sent', async () => {
    open({ threads: 2, timeMs: 3_000 })
    const warm = fileOf(1)
    await Promise.all([pool.appraiseStored('a', warm), pool.appraiseStored('a', warm)])
    const heavy = { ...fileOf(160), schemes: Array.from({ length: 20 }, (_, run) => sampleRibbed(`R${run}`).specification) }
    const sent = [1, 2].map(() => codeOf(pool.appraiseSent('a', heavy)))
    const begun = performance.now()
    await pool.appraiseStored('a', warm)
    expect(performance.now() - begun).toBeLessThan(2_500)
    expect(await Promise.all(sent)).toEqual(['too_large', 'too_large'])
  })

  it('turn away what does not fit into the queue', async () => {
    open({ waiting: 3 })
    const answers = await Promise.all(Array.from({ length: 6 }, () => codeOf(pool.appraiseSent('a', {}))))
    expect(answers.filter((code) => code === 'invalid_request').length).toBeGreaterThanOrEqual(3)
    expect(answers.filter((code) => code === 'unavailable').length).toBeGreaterThanOrEqual(2)
  })
  it('turn away a firm with too many waiting, and nobody else for it', async () => {
    open({ waitingPerFirm: 3 })
    const answers = ['a', 'a', 'a', 'a', 'a', 'a', 'b'].map((firmId) => codeOf(pool.appraiseSent(firmId, {})))
    expect((await Promise.all(answers)).filter((code) => code === 'limited').length).toBeGreaterThanOrEqual(2)
    expect(await answers.at(-1)).toBe('invalid_request')
  })
})

describe('the next to be appraised', () => {
  const waiting = (...words: string[]) =>
    words.map((word) => ({ firmId: word[0]!, job: { kind: word.endsWith('s') ? 'sent' : 'stored' } as const }))

  it.each<[string, string[], string[], number]>([
    ['whoever came first', ['a', 'b'], [], 0],
    ['what is stored before what was sent', ['as', 'a'], [], 1],
    ['a firm that has none under way', ['a', 'a', 'b'], ['a'], 2],
    ['what was sent while a thread is left to the others', ['as'], ['b'], 0],
    ['what was sent by a firm that has none under way', ['as', 'bs'], ['a'], 1],
    ['nothing while only files that were sent wait for the thread they may have', ['as', 'bs'], ['cs'], -1],
    ['what is stored while a file that was sent is under way', ['bs', 'as', 'a'], ['as'], 2],
    ['nothing of nothing', [], [], -1],
  ])('is %s', (_what, queue, running, place) => {
    expect(placeOfNext(waiting(...queue), waiting(...running), 2)).toBe(place)
  })
})
