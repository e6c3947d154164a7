import type { RibbedScheme, SolidScheme } from '#shared/contracts/appraisal'
import type { CatalogueBlock } from '#shared/contracts/blockCatalogue'
import type { SchemeInput, StoredScheme } from '#shared/contracts/project'

/** The first mark of a kind that is free: R1, R2 …, S1, S2 … */
export function nextMark(kind: 'ribbed' | 'solid', schemes: readonly StoredScheme[]): string {
  const taken = new Set(schemes.map(({ specification }) => specification.mark))
  const letter = kind === 'ribbed' ? 'R' : 'S'
  for (let number = 1; ; number++) if (!taken.has(`${letter}${number}`)) return `${letter}${number}`
}

/** A ribbed scheme to begin with: the block as bought, sizes that are common, all bars left to the engine. */
export function newRibbed(block: CatalogueBlock, schemes: readonly StoredScheme[]): SchemeInput {
  const specification: RibbedScheme = {
    mark: nextMark('ribbed', schemes),
    kind: 'ribbed',
    block: blockSizes(block),
    ribWidth: 120,
    topping: 50,
    mesh: 'A142',
    edgeStrip: 0,
    solidZone: 'least',
    crossRibs: 'rule',
    trimmerWidth: 100,
    cutBlocks: false,
    leastPiece: 50,
    alignRows: false,
    ribBars: 'computed',
    topBars: 'computed',
    givenPanels: [],
    link: 0,
  }
  return { name: `Ribs with ${block.name}`.slice(0, 120), blockId: block.id, specification }
}

/** A solid scheme to begin with: the engine finds thickness and bars. Its cheapest thickness is looked for before it is added. */
export function newSolid(schemes: readonly StoredScheme[]): SchemeInput & { readonly specification: SolidScheme } {
  const specification: SolidScheme = {
    mark: nextMark('solid', schemes),
    kind: 'solid',
    thickness: 'least',
    thicknessPer: 'scheme',
    bars: 'computed',
    givenPanels: [],
  }
  return { name: 'Solid slab', blockId: null, specification }
}

/** The same scheme under the next free mark. */
export function copyOf({ name, blockId, specification }: StoredScheme, schemes: readonly StoredScheme[]): SchemeInput {
  return { name, blockId, specification: { ...specification, mark: nextMark(specification.kind, schemes) } }
}

/** What a specification takes from a catalogue block. */
export function blockSizes({ length, width, height, mass }: CatalogueBlock): RibbedScheme['block'] {
  return { length, width, height, mass }
}
