import { describe, expect, it } from 'vitest'
import { sideEnd, snapPoint } from '../../../../shared/layout/edit/snapPoint'

const targets = {
  corners: [
    [6000, 0],
    [6000, 5000],
  ] as const,
  reachMm: 200,
  stepMm: 50,
}

describe('snapPoint', () => {
  it('falls on a corner, on the line of one, or on the grid', () => {
    expect(snapPoint([5900, 90], targets)).toEqual([6000, 0])
    expect(snapPoint([6120, 2512], targets)).toEqual([6000, 2500])
    expect(snapPoint([3012, 2488], targets)).toEqual([3000, 2500])
  })
})

describe('sideEnd', () => {
  it('runs along an axis where the pointer nearly does, else straight at it', () => {
    expect(sideEnd([0, 0], [4000, 60], 3000)).toEqual([3000, 0])
    expect(sideEnd([0, 0], [-20, -4000], 3000)).toEqual([0, -3000])
    expect(sideEnd([0, 0], [300, 400], 5000)).toEqual([3000, 4000])
  })
})
