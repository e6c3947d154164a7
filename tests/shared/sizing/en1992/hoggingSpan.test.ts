/**
 * A short span between long ones: EN 1992-1-1:2004, spans of 7, 4 and 6 m, ribs 150 at 550 of 310 overall. The outer spans pull it upwards
 * under every load case, so that 7.16.a, which divides by the steel required, has no value there. Arithmetic by an independent beam solver.
 */
import { describe, expect, it } from 'vitest'
import { appraise } from '#shared/appraise'
import { appraisal } from '#shared/contracts/appraisalResult'
import { fileOf, ribbed, row, schemeOf } from '../support/floors'

const block = { length: 200, width: 400, height: 250, mass: 15 }
const scheme = schemeOf({ ...ribbed, block, ribWidth: 150, solidZone: 800 })
const file = { ...fileOf(row([7000, 4000, 6000], 6000)), schemes: [scheme] }

describe('a span that hogs all along', () => {
  const result = appraise(file)
  const { panels, checks } = result.schemes[0]!

  it('bends with 32.2 and 25.3 kNm a rib beside it, 32.4 and 22.5 over its supports, and nowhere downwards', () => {
    const [first, short, last] = panels.map(({ moments }) => moments)
    expect(first!.midspan).toBeCloseTo(32.1716, 3)
    expect(first!.support).toBeCloseTo(32.4144, 3)
    expect(short!.midspan).toBe(0)
    expect(last!.midspan).toBeCloseTo(25.3061, 3)
    expect(last!.support).toBeCloseTo(22.4936, 3)
  })

  it('has a limit of span to depth that can be written down: 1.5·(11 + 1.5·√30·4.213 + 3.2·√30·3.213^1.5)·0.8', () => {
    const { capacity, working } = checks.find(({ panel, name }) => panel === 'P2' && name === 'deflection')!
    const root = Math.sqrt(30)
    const share = (0.001 * root) / 0.0013
    expect(capacity).toBeCloseTo(1.5 * 0.8 * (11 + 1.5 * root * share + 3.2 * root * (share - 1) ** 1.5), 9)
    expect(working).not.toMatch(/Infinity|NaN/)
  })

  it('reads as the contract has it after a journey as JSON', () => {
    expect(appraisal.safeParse(JSON.parse(JSON.stringify(result))).error).toBeUndefined()
  })
})
