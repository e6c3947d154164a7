import { describe, expect, it } from 'vitest'
import type { RibbedScheme, SolidScheme } from '#shared/contracts/appraisal'
import { comparisonSections } from '#shared/drawing/comparisonSections'
import type { SectionSubject } from '#shared/drawing/sectionBody'
import { sectionDepthMm } from '#shared/drawing/sectionBody'
import { sectionDrawing, sectionThumbnail } from '#shared/drawing/sectionDrawing'
import { unknownReinforcement } from '#shared/drawing/sectionReinforcement'
import type { SvgNode } from '#shared/drawing/svgNode'

const ribbed: RibbedScheme = {
  mark: 'R1',
  kind: 'ribbed',
  block: { length: 200, width: 400, height: 200, mass: 9.6 },
  ribWidth: 120,
  topping: 50,
  mesh: 'A142',
  edgeStrip: 0,
  solidZone: 300,
  crossRibs: 'none',
  trimmerWidth: 100,
  cutBlocks: false,
  leastPiece: 50,
  alignRows: false,
  ribBars: 'computed',
  topBars: 'computed',
  givenPanels: [],
  link: 8,
}
const solid: SolidScheme = {
  mark: 'S1',
  kind: 'solid',
  thickness: 200,
  thicknessPer: 'scheme',
  bars: 'computed',
  givenPanels: [],
}
const ribbedSubject: SectionSubject = {
  scheme: ribbed,
  depthMm: 250,
  reinforcement: { ...unknownReinforcement(25), ribBars: [{ diameter: 12, count: 3 }] },
}
const solidSubject: SectionSubject = {
  scheme: solid,
  depthMm: 200,
  reinforcement: {
    ...unknownReinforcement(25),
    cutLayer: { diameter: 10, spacing: 200 },
    lyingLayer: { diameter: 8, spacing: 250 },
  },
}

function nodesOf(node: SvgNode): SvgNode[] {
  return [node, ...node.children.flatMap((child) => (typeof child === 'string' ? [] : nodesOf(child)))]
}

function byClass(drawing: SvgNode, name: string): SvgNode[] {
  return nodesOf(drawing).filter(({ attributes }) =>
    String(attributes['class'] ?? '')
      .split(' ')
      .includes(name),
  )
}

function textsOf(drawing: SvgNode): string[] {
  return nodesOf(drawing)
    .filter(({ tag }) => tag === 'text')
    .map(({ children }) => children.join(''))
}

interface TextBox {
  readonly words: string
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
}

/** Where the words of a drawing stand, px, by the mean advance of the type they are set in. */
function textBoxesOf(drawing: SvgNode): TextBox[] {
  return nodesOf(drawing)
    .filter(({ tag }) => tag === 'text')
    .map((node) => {
      const words = node.children.join('')
      const size = number(node, 'font-size')
      const length = words.length * size * 0.47
      const [x, y] = [number(node, 'x'), number(node, 'y')]
      const before = { middle: length / 2, end: length, start: 0 }[String(node.attributes['text-anchor'] ?? 'start')]!
      const [ascent, descent] = [size * 0.72, size * 0.2]
      return node.attributes['transform'] === undefined
        ? { words, left: x - before, right: x - before + length, top: y - ascent, bottom: y + descent }
        : { words, left: x - ascent, right: x + descent, top: y - before, bottom: y - before + length }
    })
}

const number = (node: SvgNode | undefined, name: string) => Number(node?.attributes[name])
const shell = (block: SvgNode | undefined) => block?.children[0] as SvgNode

describe('the cross-section of a ribbed scheme', () => {
  const drawing = sectionDrawing(ribbedSubject, { id: 'r', widthPx: 640 })

  it('draws blocks, ribs and topping at one scale from the specification', () => {
    const [, first, second] = byClass(drawing, 'section-block').map(shell)
    const pxPerMm = number(first, 'width') / 400
    expect(number(first, 'height') / pxPerMm).toBeCloseTo(200, 1)
    expect((number(second, 'x') - number(first, 'x')) / pxPerMm).toBeCloseTo(520, 1)
    const top = number(byClass(drawing, 'section-top')[0], 'y1')
    const soffit = number(byClass(drawing, 'section-soffit')[0], 'y1')
    expect((soffit - top) / pxPerMm).toBeCloseTo(250, 0)
    expect((number(first, 'y') - top) / pxPerMm).toBeCloseTo(50, 0)
  })

  it('draws nothing past its two ends', () => {
    const [left, right] = byClass(drawing, 'section-top').flatMap((line) => [number(line, 'x1'), number(line, 'x2')])
    const rects = byClass(drawing, 'section-block').flatMap(({ children }) => children as SvgNode[])
    expect(
      rects.filter((rect) => number(rect, 'x') < left! || number(rect, 'x') + number(rect, 'width') > right! + 0.02),
    ).toEqual([])
  })

  it('cuts every bar of every rib that shows', () => {
    const bars = byClass(drawing, 'section-bar')
    const blocks = byClass(drawing, 'section-block')
    expect(bars).toHaveLength(3 * (blocks.length - 1))
    const [first, second, third] = bars.map((bar) => number(bar, 'cx'))
    expect(second! - first!).toBeCloseTo(third! - second!, 1)
  })

  it('says sizes, bars and mesh in words and figures', () => {
    expect(textsOf(drawing)).toEqual(
      expect.arrayContaining([
        '120',
        '400',
        '50',
        '200',
        '250',
        'ribs at 520',
        'Mesh A142',
        'in a 50 mm topping',
        'Hollow block 400 × 200 × 200',
        'Rib 120, 3H12',
        'link H8, cover 25',
      ]),
    )
  })

  it.each([
    ['wide blocks', 600, 200, 100, 50],
    ['a deep floor', 600, 450, 100, 50],
    ['very wide blocks', 1200, 300, 300, 150],
    ['narrow ribs without a topping', 150, 100, 50, 0],
    ['a shallow floor of wide ribs', 200, 80, 400, 40],
  ])('keeps words and figures apart and on the drawing: %s', (_, width, height, ribWidth, topping) => {
    const scheme = { ...ribbed, block: { ...ribbed.block, width, height }, ribWidth, topping }
    const ribBars = [
      { diameter: 12, count: 2 },
      { diameter: 16, count: 1 },
    ] as const
    const subject = { scheme, depthMm: height + topping, reinforcement: { ...unknownReinforcement(25), ribBars } }
    for (const widthPx of [328, 520, 640, 900, 1200]) {
      const boxes = textBoxesOf(sectionDrawing(subject, { id: 'r', widthPx }))
      const isApart = (a: TextBox, b: TextBox) => a.right <= b.left || b.right <= a.left || a.bottom <= b.top || b.bottom <= a.top
      expect(boxes.filter((box, i) => boxes.slice(i + 1).some((other) => !isApart(box, other)))).toEqual([])
      expect(boxes.filter(({ left, right }) => left < 0 || right > widthPx)).toEqual([])
    }
  })

  it('draws no bar before the bars are known', () => {
    const bare = sectionDrawing({ ...ribbedSubject, reinforcement: unknownReinforcement(25) }, { id: 'r', widthPx: 640 })
    expect(byClass(bare, 'section-bar')).toEqual([])
    expect(textsOf(bare)).toContain('Rib 120')
  })

  it('leaves the words with leaders out of a narrow drawing and keeps the figures', () => {
    const narrow = sectionDrawing(ribbedSubject, { id: 'r', widthPx: 328 })
    expect(byClass(narrow, 'section-callout')).toEqual([])
    expect(textsOf(narrow)).toEqual(expect.arrayContaining(['120', '250']))
  })

  it('tells the section in words to those who do not see it', () => {
    expect(drawing.attributes['role']).toBe('img')
    expect(drawing.attributes['aria-label']).toBe(
      'Cross-section of R1, ribbed, 250 mm overall: blocks 400 wide and 200 high, ribs 120, topping 50',
    )
  })
})

describe('the cross-section of a solid scheme', () => {
  it('spaces the cut bars as they are spaced and lays the other layer on them', () => {
    const drawing = sectionDrawing(solidSubject, { id: 's', widthPx: 640 })
    const [slab] = byClass(drawing, 'section-solid').map((group) => group.children[0] as SvgNode)
    const pxPerMm = number(slab, 'height') / 200
    const bars = byClass(drawing, 'section-bar')
    const cut = bars.filter(({ tag }) => tag === 'circle')
    expect((number(cut[1], 'cx') - number(cut[0], 'cx')) / pxPerMm).toBeCloseTo(200, 0)
    const lying = bars.find(({ tag }) => tag === 'line')
    expect((number(cut[0], 'cy') - number(lying, 'y1')) / pxPerMm).toBeCloseTo(10 / 2 + 8 / 2, 0)
    expect(textsOf(drawing)).toEqual(expect.arrayContaining(['H10 at 200, across H8 at 250', 'bottom, cover 25', '200']))
  })

  it('takes the sized depth where the thickness was left open, and dashes what is not known', () => {
    const open: SolidScheme = { ...solid, thickness: 'least' }
    expect(sectionDepthMm({ scheme: open, depthMm: 165 })).toBe(165)
    const unsized = sectionThumbnail({ scheme: open, depthMm: null }, { id: 't', widthPx: 96, heightPx: 32 })
    expect(byClass(unsized, 'section-unsized')).toHaveLength(1)
    expect(unsized.attributes['aria-label']).toContain('thickness not known yet')
  })
})

describe('both sections beside each other', () => {
  const drawing = comparisonSections({ ribbed: ribbedSubject, solid: solidSubject }, { id: 'c', widthPx: 1264 })

  it('stand on one soffit at one scale', () => {
    const [slab] = byClass(drawing, 'section-solid').map((group) => group.children[0] as SvgNode)
    const block = shell(byClass(drawing, 'section-block')[1])
    expect(number(slab, 'height') / 200).toBeCloseTo(number(block, 'width') / 400, 2)
    expect(number(slab, 'y') + number(slab, 'height')).toBeCloseTo(number(block, 'y') + number(block, 'height'), 1)
  })

  it("dash the other scheme's top through each and name the higher one", () => {
    const [overRibbed, overSolid] = byClass(drawing, 'section-other-top')
    const [ribbedTop, solidTop] = byClass(drawing, 'section-top').map((line) => number(line, 'y1'))
    expect(number(overRibbed, 'y1')).toBe(solidTop)
    expect(number(overSolid, 'y1')).toBe(ribbedTop)
    expect(textsOf(drawing)).toContain('top of ribbed')
  })

  it('dash nothing where both are as deep', () => {
    const asDeep = { ...solidSubject, scheme: { ...solid, thickness: 250 } }
    const even = comparisonSections({ ribbed: ribbedSubject, solid: asDeep }, { id: 'c', widthPx: 1264 })
    expect(byClass(even, 'section-other-top')).toEqual([])
  })
})

describe('every section', () => {
  const drawings = [
    sectionDrawing(ribbedSubject, { id: 'one', widthPx: 640 }),
    sectionDrawing(solidSubject, { id: 'two', widthPx: 328 }),
    sectionThumbnail(ribbedSubject, { id: 'three', widthPx: 96, heightPx: 32 }),
    comparisonSections({ ribbed: ribbedSubject, solid: solidSubject }, { id: 'four', widthPx: 360 }),
  ]

  it.each(drawings)('takes colours from the page and carries no inline style', (drawing) => {
    const paints = nodesOf(drawing).flatMap(({ attributes }) => [attributes['fill'], attributes['stroke']])
    expect(
      paints.filter((paint) => paint !== undefined && !/^(none|var\(--[\w-]+\)|url\(#[\w-]+\))$/.test(String(paint))),
    ).toEqual([])
    expect(nodesOf(drawing).filter(({ attributes }) => 'style' in attributes)).toEqual([])
  })

  it.each(drawings)('uses only hatches that it defines', (drawing) => {
    const ids = nodesOf(drawing).flatMap(({ attributes }) =>
      attributes['id'] === undefined ? [] : [`url(#${attributes['id']})`],
    )
    const used = nodesOf(drawing).flatMap(({ attributes }) =>
      Object.values(attributes).filter((value) => String(value).startsWith('url(')),
    )
    expect(used.filter((reference) => !ids.includes(String(reference)))).toEqual([])
    expect(new Set(ids).size).toBe(ids.length)
  })
})
