import { describe, expect, it } from 'vitest'
import { orderedBlocks } from '../../../shared/takeoff/orderedBlocks'

describe('orderedBlocks', () => {
  it('adds breakage and rounds up to a block', () => {
    // 1754 × 1.03 = 1806.62
    expect(orderedBlocks(1754, { breakagePercent: '3', palletCount: null })).toBe(1807)
    // 200 × 1.05 = 210 exactly
    expect(orderedBlocks(200, { breakagePercent: '5', palletCount: null })).toBe(210)
  })

  it('rounds up to a pallet', () => {
    expect(orderedBlocks(1754, { breakagePercent: '3', palletCount: 60 })).toBe(1860)
    expect(orderedBlocks(0, { breakagePercent: '3', palletCount: 60 })).toBe(0)
  })
})
