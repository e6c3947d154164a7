import type { AppraisalFileInput } from '#shared/contracts/appraisal'

type Point = [number, number]
type Ring = Point[]
type PanelInput = AppraisalFileInput['levels'][number]['panels'][number]

/** Numbers in [0, 1) that follow from a seed: the same floors at every run. */
export function seeded(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0
    return state / 2 ** 32
  }
}

/** Lines of a grid from 0, each bay between two bounds, in steps of 50 mm. */
function gridLines(bays: number, least: number, most: number, next: () => number): number[] {
  const lines = [0]
  for (let i = 0; i < bays; i += 1) lines.push(lines[i]! + least + 50 * Math.floor((next() * (most - least)) / 50))
  return lines
}

const SUPPORT_MM = 250

/** What shapes a level has: bays across and along, and how often a bay of the border is cut to an L, has a void or turns its ribs. */
export interface MixedShape {
  readonly columns: number
  readonly rows: number
  readonly cutShare: number
  readonly voidShare: number
  readonly turnShare: number
}

export const FORTY_PANELS: MixedShape = { columns: 8, rows: 5, cutShare: 0.4, voidShare: 0.25, turnShare: 0.3 }

/**
 * A level of bays of differing sizes: the last column is skewed, some bays of the top row are L-shaped, some bays have a void; inner
 * edges are continuous.
 */
export function mixedPanels({ columns, rows, cutShare, voidShare, turnShare }: MixedShape, seed: number): PanelInput[] {
  const next = seeded(seed)
  const [xs, ys] = [gridLines(columns, 4200, 7200, next), gridLines(rows, 3900, 6600, next)]
  const lean = next() * 0.08
  const at = (column: number, row: number): Point => [xs[column]! + (column === columns ? lean * ys[row]! : 0), ys[row]!]
  return Array.from({ length: columns * rows }, (_, index): PanelInput => {
    const [column, row] = [index % columns, Math.floor(index / columns)]
    const corners: Ring = [at(column, row), at(column + 1, row), at(column + 1, row + 1), at(column, row + 1)]
    const isOuter = [row === 0, column === columns - 1, row === rows - 1, column === 0]
    const isCut = row === rows - 1 && column < columns - 1 && next() < cutShare
    const outline = isCut ? cornerCut(corners) : corners
    const outer = isCut ? [...isOuter.slice(0, 2), true, true, ...isOuter.slice(2)] : isOuter
    const isWide = xs[column + 1]! - xs[column]! > ys[row + 1]! - ys[row]!
    return {
      mark: `P${index + 1}`,
      outline,
      edges: outer.map((is) => ({ supportWidth: SUPPORT_MM, continuity: is ? 'discontinuous' : 'continuous' })),
      ribDirection: isWide === next() > turnShare ? 90 : 0,
      voids: next() < voidShare ? [voidIn(corners[0]!, next)] : [],
    }
  })
}

/** An L: the upper right corner of a bay taken out. */
function cornerCut([a, b, c, d]: Ring): Ring {
  const cut: Point = [900, 1200]
  return [a!, b!, [c![0], c![1] - cut[1]], [c![0] - cut[0], c![1] - cut[1]], [c![0] - cut[0], c![1]], d!]
}

function voidIn([x, y]: Point, next: () => number): Ring {
  const [width, height] = [600 + 50 * Math.floor(next() * 12), 600 + 50 * Math.floor(next() * 8)]
  const [left, low] = [x + 1200, y + 1100]
  return [
    [left, low],
    [left + width, low],
    [left + width, low + height],
    [left, low + height],
  ]
}

const LOADS = { imposedLoad: 2.5, finishesLoad: 1.5, partitionsLoad: 1, cover: 25, fireMinutes: 60 } as const

const SCHEMES: AppraisalFileInput['schemes'] = [
  {
    mark: 'R1',
    kind: 'ribbed',
    block: { length: 200, width: 400, height: 250, mass: 15 },
    ribWidth: 125,
    topping: 60,
    mesh: 'A142',
    solidZone: 'least',
    crossRibs: 'rule',
    cutBlocks: true,
  },
  { mark: 'S1', kind: 'solid', thickness: 'least' },
]

/** A level of mixed panels, both kinds left to the engine, on either basis. */
export function mixedFile(basis: 'EN1992' | 'BS8110', seed: number, shape: MixedShape = FORTY_PANELS): AppraisalFileInput {
  return {
    format: 'bothways.appraisal/1',
    brief: basis === 'EN1992' ? { basis, ...LOADS, fck: 30, fyk: 500 } : { basis, ...LOADS, fcu: 35, fy: 460 },
    levels: [{ mark: 'L1', panels: mixedPanels(shape, seed) }],
    schemes: SCHEMES,
    rates: { currency: 'USD', items: { 'concrete.slab': '150', 'formwork.soffit': '20', 'blocks.whole': '2' } },
  }
}
