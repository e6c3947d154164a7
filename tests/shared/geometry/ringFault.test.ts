import { describe, expect, it } from 'vitest'
import type { Point } from '#shared/geometry/point'
import { findRingFault, isSimple } from '#shared/geometry/ringFault'

describe('findRingFault', () => {
  it.each<[string, Point[], ReturnType<typeof findRingFault>]>([
    [
      'a square',
      [
        [0, 0],
        [10, 0],
        [10, 10],
        [0, 10],
      ],
      null,
    ],
    [
      'a corner in the middle of a side',
      [
        [0, 0],
        [5, 0],
        [10, 0],
        [10, 10],
        [0, 10],
      ],
      null,
    ],
    [
      'a clockwise square',
      [
        [0, 10],
        [10, 10],
        [10, 0],
        [0, 0],
      ],
      { kind: 'clockwise' },
    ],
    [
      'a bow tie',
      [
        [0, 0],
        [10, 10],
        [10, 0],
        [0, 10],
      ],
      { kind: 'crosses', edge: 0, other: 2 },
    ],
    [
      'a point given twice',
      [
        [0, 0],
        [10, 0],
        [10, 0],
        [0, 10],
      ],
      { kind: 'repeated', vertex: 2 },
    ],
    [
      'a closed ring',
      [
        [0, 0],
        [10, 0],
        [0, 10],
        [0, 0],
      ],
      { kind: 'repeated', vertex: 3 },
    ],
    [
      'points in one line',
      [
        [5, 5],
        [0, 0],
        [10, 10],
      ],
      { kind: 'flat' },
    ],
    [
      'a spike',
      [
        [0, 0],
        [20, 0],
        [10, 0.0001],
        [10, 10],
        [0, 10],
      ],
      { kind: 'foldsBack', vertex: 1 },
    ],
    [
      'two squares that touch at a corner',
      [
        [0, 0],
        [5, 0],
        [5, 5],
        [10, 5],
        [10, 10],
        [5, 10],
        [5, 5],
        [0, 5],
      ],
      { kind: 'crosses', edge: 1, other: 5 },
    ],
  ])('tells of %s', (_, ring, fault) => {
    expect(findRingFault(ring)).toEqual(fault)
  })

  it('leaves the direction out of being simple', () => {
    expect(
      isSimple([
        [0, 10],
        [10, 10],
        [10, 0],
        [0, 0],
      ]),
    ).toBe(true)
    expect(
      isSimple([
        [0, 0],
        [10, 10],
        [10, 0],
        [0, 10],
      ]),
    ).toBe(false)
  })
})
