import { describe, expect, it } from 'vitest'
import type { RibbedScheme } from '../../../../shared/contracts/appraisal'
import { ribbed } from '../../../../shared/contracts/appraisal'
import { rectangleFit } from '../../../../shared/layout/edit/rectangleFit'
import { gridPanels } from './support/gridPanels'

const scheme: RibbedScheme = ribbed.parse({
  mark: 'R1',
  kind: 'ribbed',
  block: { length: 200, width: 400, height: 200, mass: 15 },
  ribWidth: 120,
  topping: 50,
  edgeStrip: 100,
  solidZone: 0,
})

describe('rectangleFit', () => {
  it('tells what the supports leave, what a row needs, and the likely length', () => {
    expect(rectangleFit(gridPanels([540], [5400])[0]!, scheme)).toEqual({
      column: 'alongX',
      reason: '540 leaves 290 between two supports of 250; one row of blocks needs 600',
      repair: 'Was it 5,400?',
    })
  })

  it('looks at the length along the ribs for one block', () => {
    expect(rectangleFit(gridPanels([5400], [440])[0]!, scheme)).toMatchObject({
      column: 'alongY',
      reason: '440 leaves 190 between two supports of 250; one block needs 200',
    })
  })

  it('has nothing to say where a row fits exactly, or of a panel by points', () => {
    const [panel] = gridPanels([850], [5400])
    expect(rectangleFit(panel!, scheme)).toBeNull()
    expect(rectangleFit({ ...panel!, outline: panel!.outline.slice(0, 3) }, scheme)).toBeNull()
  })
})
