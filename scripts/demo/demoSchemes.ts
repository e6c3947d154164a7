import type { RibbedScheme } from '#shared/contracts/appraisal'
import { DEMO_BLOCKS } from './demoBlocks'
import type { DemoProject } from './demoProject'

type DemoScheme = DemoProject['schemes'][number]
type RibbedSizes = Pick<RibbedScheme, 'ribWidth' | 'topping' | 'mesh'>

/** A ribbed scheme on a block of the demo catalogue; bars, cross ribs and solid zones are left to the engine. */
export function ribbedScheme(mark: string, name: string, blockCode: string, sizes: RibbedSizes): DemoScheme {
  const { length, width, height, mass } = DEMO_BLOCKS.find(({ code }) => code === blockCode)!
  return {
    name,
    blockCode,
    specification: {
      mark,
      kind: 'ribbed',
      block: { length, width, height, mass },
      ...sizes,
      edgeStrip: 100,
      solidZone: 'least',
      crossRibs: 'rule',
      trimmerWidth: 200,
      cutBlocks: false,
      leastPiece: 50,
      alignRows: false,
      ribBars: 'computed',
      topBars: 'computed',
      givenPanels: [],
      link: 0,
    },
  }
}

/** A solid scheme of the least thickness that passes. */
export const solidScheme = (mark: string, name: string): DemoScheme => ({
  name,
  blockCode: null,
  specification: { mark, kind: 'solid', thickness: 'least', thicknessPer: 'scheme', bars: 'computed', givenPanels: [] },
})
