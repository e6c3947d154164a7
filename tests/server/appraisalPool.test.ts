import { afterEach, describe, expect, it } from 'vitest'
import type { AppError } from '../../server/errors'
import { createAppraisalPool, type AppraisalPool, type PoolBounds } from '../../server/services/appraisal/appraisalPool'
import { appraisalFile } from '../../shared/contracts/appraisal'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../support/sampleProject'

let pool: AppraisalPool
afterEach(() => pool.close())
const open = (bounds: Partial<PoolBounds>) => (pool = createAppraisalPool({ threads: 1, waiting: 50, timeMs: 20_000, ...bounds }))

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
    await pool.appraiseSent({}).catch(() => undefined)
    let longestMs = 0
    let last = performance.now()
    const watch = setInterval(() => {
      longestMs = Math.max(longestMs, performance.now() - last)
      last = performance.now()
    }, 5)
    const begun = performance.now()
    await pool.appraiseSent(fileOf(100))
    const tookMs = performance.now() - begun
    clearInterval(watch)
    expect(longestMs).toBeLessThan(Math.max(200, tookMs / 2))
  })

  it('break off what takes too long, and go on with the next', async () => {
    open({ timeMs: 400 })
    await pool.appraiseSent({}).catch(() => undefined)
    const heavy = { ...fileOf(160), schemes: Array.from({ length: 20 }, (_, run) => sampleRibbed(`R${run}`).specification) }
    const answers = [codeOf(pool.appraiseSent(heavy)), codeOf(pool.appraiseSent({}))]
    expect(await Promise.all(answers)).toEqual(['too_large', 'invalid_request'])
    expect(await codeOf(pool.appraiseSent({}))).toBe('invalid_request')
  })

  it('leave one thread to stored projects while heavy files are sent', async () => {
    open({ threads: 2, timeMs: 3_000 })
    const warm = fileOf(1)
    await Promise.all([pool.appraiseStored(warm), pool.appraiseStored(warm)])
    const heavy = { ...fileOf(160), schemes: Array.from({ length: 20 }, (_, run) => sampleRibbed(`R${run}`).specification) }
    const sent = [1, 2].map(() => codeOf(pool.appraiseSent(heavy)))
    const begun = performance.now()
    await pool.appraiseStored(warm)
    expect(performance.now() - begun).toBeLessThan(2_500)
    expect(await Promise.all(sent)).toEqual(['too_large', 'too_large'])
  })

  it('turn away what does not fit into the queue', async () => {
    open({ waiting: 3 })
    const answers = await Promise.all(Array.from({ length: 6 }, () => codeOf(pool.appraiseSent({}))))
    expect(answers.filter((code) => code === 'invalid_request').length).toBeGreaterThanOrEqual(3)
    expect(answers.filter((code) => code === 'unavailable').length).toBeGreaterThanOrEqual(2)
  })
})
