import { describe, expect, it } from 'vitest'
import { checkFloor } from '#shared/layout/checkFloor'
import { fileOf, panelOf, rectangle, ribbedScheme } from './support/floorParts'

type Outline = [number, number][]
const panelIssues = (given: object) => checkFloor(fileOf([panelOf(given)]))
const beam = { supportWidth: 300, continuity: 'discontinuous' }

describe('checkFloor on outlines', () => {
  it('finds nothing wrong with a sound panel', () => {
    expect(panelIssues({})).toEqual([])
  })

  it('tells a clockwise outline what was expected', () => {
    expect(panelIssues({ outline: rectangle(0, 0, 6000, 4500).reverse() })).toEqual([
      { path: 'levels.0.panels.0.outline', message: 'the points run clockwise: expected anticlockwise' },
    ])
  })

  it.each<[string, Outline, string, RegExp]>([
    [
      'a bow tie',
      [
        [0, 0],
        [6000, 4500],
        [6000, 0],
        [0, 4500],
      ],
      'outline.0',
      /side \(0, 0\) to \(6000, 4500\) meets the side \(6000, 0\) to \(0, 4500\)/,
    ],
    [
      'a repeated point',
      [
        [0, 0],
        [6000, 0],
        [6000, 0],
        [0, 4500],
      ],
      'outline.2',
      /point \(6000, 0\).*expected each corner once/,
    ],
    ['a closed ring', [...rectangle(0, 0, 6000, 4500), [0, 0]], 'outline.4', /the first not repeated at the end/],
    [
      'points in one line',
      [
        [0, 0],
        [3000, 0],
        [6000, 0],
      ],
      'outline',
      /one line: expected corners around an area/,
    ],
    [
      'a side that runs back',
      [
        [0, 0],
        [6000, 0],
        [6000, 4500],
        [0, 4500],
        [3000, 4500],
        [0, 4000],
      ],
      'outline.3',
      /runs back over itself at \(0, 4500\)/,
    ],
    [
      'a corner that touches a far side',
      [
        [0, 0],
        [6000, 0],
        [6000, 4500],
        [3000, 0],
        [0, 4500],
      ],
      'outline.0',
      /neither cross nor touch/,
    ],
  ])('refuses %s and names the point', (_, outline, path, message) => {
    const issues = panelIssues({ outline })
    expect(issues.map((issue) => issue.path)).toContain(`levels.0.panels.0.${path}`)
    expect(issues[0]!.message).toMatch(message)
  })
})

describe('checkFloor on edges', () => {
  it('refuses a number of edges that is neither 1 nor the number of sides', () => {
    expect(panelIssues({ edges: [beam, beam, beam] })).toEqual([
      { path: 'levels.0.panels.0.edges', message: '3 edges for 4 sides: expected 1 edge that serves all sides, or 4' },
    ])
  })

  it('refuses a free edge with a support', () => {
    expect(panelIssues({ edges: [beam, beam, { supportWidth: 200, continuity: 'free' }, beam] })).toEqual([
      { path: 'levels.0.panels.0.edges.2.supportWidth', message: 'a free edge has no support: expected 0 instead of 200' },
    ])
  })

  it('refuses supports that leave no clear outline', () => {
    const issues = panelIssues({ outline: rectangle(0, 0, 6000, 280) })
    expect(issues).toHaveLength(1)
    expect(issues[0]!.path).toBe('levels.0.panels.0.edges.0.supportWidth')
    expect(issues[0]!.message).toMatch(/no clear length along edge 1/)
  })

  it('refuses supports whose faces meet in a neck', () => {
    const outline: Outline = [
      [0, 0],
      [3000, 0],
      [3000, 2000],
      [5000, 2000],
      [5000, 0],
      [8000, 0],
      [8000, 4000],
      [5000, 4000],
      [5000, 2250],
      [3000, 2250],
      [3000, 4000],
      [0, 4000],
    ]
    expect(panelIssues({ outline }).map(({ path, message }) => `${path}: ${message}`)).toEqual([
      expect.stringMatching(/^levels\.0\.panels\.0\.outline: the supports meet inside the panel/),
    ])
  })
})

describe('checkFloor on voids', () => {
  it('accepts one that stands on the support face', () => {
    expect(panelIssues({ voids: [rectangle(150, 150, 1000, 2000)] })).toEqual([])
  })

  it.each<[string, Outline[], string, RegExp]>([
    ['outside', [rectangle(7000, 0, 500, 500)], 'voids.0', /expected it inside the clear outline/],
    ['over a support', [rectangle(0, 1000, 500, 500)], 'voids.0', /past the support faces/],
    ['clockwise', [rectangle(1000, 1000, 500, 500).reverse()], 'voids.0', /clockwise: expected anticlockwise/],
    [
      'over another',
      [rectangle(1000, 1000, 500, 500), rectangle(1400, 1400, 500, 500)],
      'voids.1',
      /over void 0 .*expected voids apart/,
    ],
    ['within another', [rectangle(1000, 1000, 900, 900), rectangle(1200, 1200, 200, 200)], 'voids.1', /expected voids apart/],
    ['as large as the panel', [rectangle(150, 150, 5700, 4200)], 'voids', /expected some floor to be left/],
  ])('refuses one that lies %s', (_, voids, path, message) => {
    const issues = panelIssues({ voids })
    expect(issues).toHaveLength(1)
    expect(issues[0]!.path).toBe(`levels.0.panels.0.${path}`)
    expect(issues[0]!.message).toMatch(message)
  })
})

describe('checkFloor on a level', () => {
  const beside = panelOf({ mark: 'P2', outline: rectangle(6000, 0, 6000, 4500) })

  it('accepts panels side by side, a slip of less than a millimetre forgiven', () => {
    const slipped = panelOf({ mark: 'P3', outline: rectangle(0, 4499.6, 6000, 4500) })
    expect(checkFloor(fileOf([panelOf(), beside, slipped]))).toEqual([])
  })

  it('refuses panels that lie over each other, and says by how much', () => {
    const over = panelOf({ mark: 'P3', outline: rectangle(5500, 4000, 6000, 4500) })
    expect(checkFloor(fileOf([panelOf(), beside, over]))).toEqual([
      { path: 'levels.0.panels.2.outline', message: 'panel P3 lies over panel P1 by 0.250 m²: expected panels side by side' },
      { path: 'levels.0.panels.2.outline', message: 'panel P3 lies over panel P2 by 2.750 m²: expected panels side by side' },
    ])
  })

  it('refuses the same panel twice', () => {
    expect(checkFloor(fileOf([panelOf(), panelOf({ mark: 'P2' })])).map(({ path }) => path)).toEqual([
      'levels.0.panels.1.outline',
    ])
  })

  it('refuses marks used twice: of panels, levels and schemes', () => {
    const levels = [
      { mark: 'L1', panels: [panelOf(), { ...beside, mark: 'P1' }] },
      { mark: 'L1', panels: [panelOf()] },
    ]
    const schemes = [ribbedScheme(), { mark: 'R1', kind: 'solid', thickness: 200 }]
    expect(checkFloor(fileOf([], { levels, schemes })).map(({ path, message }) => `${path}: ${message}`)).toEqual([
      'levels.1.mark: L1 is used already: expected every level to have its own mark',
      'levels.0.panels.1.mark: P1 is used already: expected every panel of level L1 to have its own mark',
      'schemes.1.mark: R1 is used already: expected every scheme to have its own mark',
    ])
  })
})

describe('checkFloor on blocks', () => {
  const schemes = (given: object) => ({ schemes: [{ mark: 'S1', kind: 'solid', thickness: 200 }, ribbedScheme(given)] })

  it('refuses a block that is wider than the panel leaves room for', () => {
    const narrow = panelOf({ outline: rectangle(0, 0, 6000, 650) })
    expect(checkFloor(fileOf([narrow], schemes({})))).toEqual([
      {
        path: 'schemes.1.block.width',
        message:
          'panel P1 of level L1: 350 mm are clear across the ribs, one row of blocks needs 400 mm: expected room for a row',
      },
    ])
  })

  it('counts edge strips in', () => {
    const narrow = panelOf({ outline: rectangle(0, 0, 6000, 800) })
    const [issue] = checkFloor(fileOf([narrow], schemes({ edgeStrip: 75.5 })))
    expect(issue!.message).toMatch(
      /500 mm are clear across the ribs, one row of blocks needs 551 mm \(a block 400 wide and two edge strips of 75.5\)/,
    )
  })

  it('refuses solid zones that leave no length for a block', () => {
    expect(checkFloor(fileOf([panelOf()], schemes({ solidZone: 2800 })))).toEqual([
      {
        path: 'schemes.1.block.length',
        message:
          'panel P1 of level L1: 100 mm is the longest length left for blocks in any row, a block is 200 mm long: expected room for a block',
      },
    ])
    expect(checkFloor(fileOf([panelOf()], schemes({ solidZone: 2800, cutBlocks: true })))).toEqual([])
  })

  it('refuses a panel that would take more blocks than any floor', () => {
    const [issue] = checkFloor(fileOf([panelOf({ outline: rectangle(0, 0, 900_000, 900_000) })], schemes({})))
    // 899.7 × 899.7 m between supports at 10 a square metre
    expect(issue!.message).toMatch(/about 8094601 blocks: expected at most 100000 in one panel/)
  })
})

it('checks 500 panels in a moment', () => {
  const panels = Array.from({ length: 500 }, (_, i) =>
    panelOf({ mark: `P${i}`, outline: rectangle((i % 25) * 6000, Math.floor(i / 25) * 4500, 6000, 4500) }),
  )
  const file = fileOf(panels)
  const start = performance.now()
  expect(checkFloor(file)).toEqual([])
  expect(performance.now() - start).toBeLessThan(5000)
})
