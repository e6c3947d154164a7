import { describe, expect, it } from 'vitest'
import { panel as panelSchema, ribbed } from '#shared/contracts/appraisal'
import { layOutPanel } from '#shared/layout/layOutPanel'

const scheme = (given: object = {}) =>
  ribbed.parse({
    mark: 'R',
    kind: 'ribbed',
    block: { length: 200, width: 400, height: 200, mass: 15 },
    ribWidth: 100,
    topping: 50,
    solidZone: 300,
    ...given,
  })
const panel = (given: object = {}) =>
  panelSchema.parse({
    mark: 'P1',
    outline: [
      [0, 0],
      [6000, 0],
      [6000, 4500],
      [0, 4500],
    ],
    edges: [{ supportWidth: 300, continuity: 'discontinuous' }],
    ribDirection: 0,
    ...given,
  })

describe('layOutPanel', () => {
  it('lays 8 rows of 25 blocks between 300 mm beams on 6.0 × 4.5 m', () => {
    const layout = layOutPanel(panel(), scheme(), 300, null, [false, false, false, false])
    // clear 5700 × 4200: ⌊(4200 + 100) / 500⌋ = 8 rows, ⌊(5700 − 2 × 300) / 200⌋ = 25 blocks in each
    expect(layout.rows).toHaveLength(8)
    expect(layout.blocksWhole).toBe(8 * 25)
    expect(layout.closedEnds).toBe(16)
    expect(layout.longestRib).toBe(5700)
  })
})
