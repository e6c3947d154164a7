import { describe, expect, it } from 'vitest'
import type { Finding } from '#shared/sizing/finding'
import { slenderFlags } from '#shared/sizing/slenderFlags'

const deflection = (demand: number, capacity: number): Finding => ({
  name: 'deflection',
  place: () => 'midspan',
  clause: 'EN 1992-1-1 7.4.2(2)',
  demand,
  capacity,
  unit: '-',
  working: () => '',
})

const european = { greatestTabulatedSpanDepth: 30 * 1.5 }

describe('slenderFlags', () => {
  it('warns where a slab passes beyond every tabulated value, 30 times 1.5', () => {
    expect(slenderFlags([deflection(55, 80)], european)).toEqual([
      'span to depth 55 passes the expression only by its low steel ratio; tabulated values end at 45: an engineer should calculate the deflection',
    ])
  })

  it('is silent up to the tabulated values, and where the check fails anyway', () => {
    expect(slenderFlags([deflection(45, 80)], european)).toEqual([])
    expect(slenderFlags([deflection(55, 50)], european)).toEqual([])
  })
})
