import type { BlockInput } from '#shared/contracts/blockCatalogue'

export const MATERIALS = [
  { value: 'fired clay', label: 'Fired clay' },
  { value: 'concrete', label: 'Concrete' },
  { value: 'lightweight concrete', label: 'Lightweight concrete' },
] as const satisfies readonly { value: BlockInput['material']; label: string }[]

/** Rib between blocks that blocks per m² are told for, mm: what a new ribbed scheme begins with. */
export const RIB_WIDTH_MM = 120
const MM2_PER_M2 = 1_000_000

/** Blocks in a square metre of field, row by row with ribs of the usual width between, to two decimals. */
export function blocksPerM2({ length, width }: Pick<BlockInput, 'length' | 'width'>): string {
  return (MM2_PER_M2 / (length * (width + RIB_WIDTH_MM))).toFixed(2)
}

/** A block to begin with: a common size, to be typed over. */
export function newBlock(): BlockInput {
  return {
    code: '',
    name: '',
    material: 'fired clay',
    length: 200,
    width: 400,
    height: 200,
    mass: 15,
    supplier: '',
    palletCount: null,
    breakagePercent: '3',
    priceCode: null,
  }
}
