import type { BlockInput } from '#shared/contracts/blockCatalogue'

/** Invented blocks of invented makers. Length runs along the rib; millimetres and kilograms. */
export const DEMO_BLOCKS: readonly BlockInput[] = [
  clay('HC 150', 150, 10),
  clay('HC 200', 200, 15),
  clay('HC 250', 250, 20),
  {
    code: 'DV 165',
    name: 'Hollow clay block 355 × 165',
    material: 'fired clay',
    length: 250,
    width: 355,
    height: 165,
    mass: 13,
    supplier: 'Dunvale Brick and Tile',
    palletCount: 96,
    breakagePercent: '4',
    priceCode: null,
  },
  {
    code: 'SQ 200',
    name: 'Hollow concrete block 400 × 200',
    material: 'concrete',
    length: 200,
    width: 400,
    height: 200,
    mass: 21,
    supplier: 'Stonequay Precast',
    palletCount: 72,
    breakagePercent: '2',
    priceCode: null,
  },
  {
    code: 'LA 240',
    name: 'Lightweight block 480 × 240',
    material: 'lightweight concrete',
    length: 250,
    width: 480,
    height: 240,
    mass: 16.5,
    supplier: 'Stonequay Precast',
    palletCount: null,
    breakagePercent: '5',
    priceCode: null,
  },
]

function clay(code: string, height: number, mass: number): BlockInput {
  return {
    code,
    name: `Hollow clay block 400 × ${height}`,
    material: 'fired clay',
    length: 200,
    width: 400,
    height,
    mass,
    supplier: 'Harrowcombe Clayworks',
    palletCount: 120,
    breakagePercent: '3',
    priceCode: null,
  }
}
