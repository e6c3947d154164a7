/**
 * Block counts and concrete of hollow-block floors.
 *
 * "Hollow Block Slabs" (course slides, author not named, no date), arrangement of blocks, first example; seen as text. Its rules: length
 *   along the ribs = 2 solid parts + 200 × blocks + 100 × cross ribs; length across = 2 solid parts + 500 × rows − 100.
 * Q-I1, Q-I2, Q-I3 and the table of common blocks: identities of one pitch, geometry, no source.
 */
import { describe, expect, it } from 'vitest'
import { fieldCheck } from '#shared/layout/fieldCheck'
import { layOutPanel } from '#shared/layout/layOutPanel'
import { panelOf, rectangle, ribbedScheme } from '../layout/support/floorParts'

/** Half of the last printed digit. */
const half = (decimals: number) => 0.5 * 10 ** -decimals

describe('Q-6, 3850 along the ribs × 5000 across, 300 solid at each end', () => {
  const scheme = ribbedScheme({ edgeStrip: 300, solidZone: 300 })
  const layout = layOutPanel(
    panelOf({ outline: rectangle(0, 0, 3850, 5000), edges: [{ supportWidth: 0, continuity: 'discontinuous' }] }),
    scheme,
    300,
    null,
    [],
  )

  it('takes 9 rows', () => {
    expect(layout.rows).toHaveLength(9)
  })

  it('takes 16 blocks in every row, from 16.25 that would fit', () => {
    for (const { lengths, runs } of layout.rows) {
      expect((lengths[0]!.end - lengths[0]!.start) / scheme.block.length).toBeCloseTo(16.25, 9)
      expect(runs.map(({ blocks }) => blocks)).toEqual([16])
    }
    expect(layout.blocksWhole).toBe(144)
  })

  it('adds the 50 mm left over to the solid parts, half at each end', () => {
    for (const { runs } of layout.rows) expect(runs.map(({ start, end }) => [start, end])).toEqual([[325, 3525]])
  })
})

const block = (length: number, width: number, height: number) => ({ length, width, height, mass: 0 })

describe('one square metre in the field', () => {
  it.each([
    ['Q-I1', block(200, 400, 200), 100, 50, 10.0, 1, 0.09, 3],
    ['Q-I2', block(200, 400, 250), 100, 50, 10.0, 1, 0.1, 3],
    ['Q-I3', block(200, 400, 200), 120, 70, 9.615, 3, 0.11615, 5],
    ['table, 150 high', block(200, 400, 150), 100, 50, 10.0, 1, 0.08, 3],
    ['table, 200 high', block(200, 400, 200), 100, 50, 10.0, 1, 0.09, 3],
    ['table, 250 high', block(200, 400, 250), 120, 70, 9.6, 1, 0.128, 3],
    ['table, 380 wide', block(200, 380, 200), 100, 50, 10.4, 1, 0.092, 3],
    ['table, 250 long', block(250, 355, 165), 100, 50, 8.8, 1, 0.086, 3],
  ])('%s: blocks and concrete as printed', (_, size, ribWidth, topping, blocks, blockDecimals, concrete, concreteDecimals) => {
    const field = fieldCheck(ribbedScheme({ block: size, ribWidth, topping }))
    expect(Math.abs(field.blocksPerM2 - blocks)).toBeLessThanOrEqual(half(blockDecimals))
    expect(Math.abs(field.concretePerM2 - concrete)).toBeLessThanOrEqual(half(concreteDecimals))
  })

  it.each([
    ['Q-I1', block(200, 400, 200), 100, 50, 10, 0.09],
    ['Q-I3', block(200, 400, 200), 120, 70, 9.61538, 0.11615],
  ])(
    '%s: a panel of whole pitches, laid out without strips and zones, comes to the same',
    (_, size, ribWidth, topping, blocks, concrete) => {
      const scheme = ribbedScheme({ block: size, ribWidth, topping, solidZone: 0 })
      const rows = 12
      // one rib less than rows: half a rib more on each side makes whole pitches
      const across = rows * (size.width + ribWidth)
      const free = [{ supportWidth: 0, continuity: 'free' }]
      const layout = layOutPanel(panelOf({ outline: rectangle(0, 0, 6000, across), edges: free }), scheme, 0, null, [])
      const areaM2 = layout.areas.clear / 1e6
      expect(layout.blocksWhole / areaM2).toBeCloseTo(blocks, 4)
      const volumeM3 = (layout.areas.clear * (topping + size.height) - layout.areas.blocks * size.height) / 1e9
      expect(volumeM3 / areaM2).toBeCloseTo(concrete, 5)
    },
  )
})
