import { describe, expect, it } from 'vitest'
import { ledgerAxis, ledgerDrawing, ledgerScale, signedShort } from '#shared/drawing/ledgerDrawing'
import { niceTicks } from '#shared/drawing/niceTicks'
import type { SvgNode } from '#shared/drawing/svgNode'

const ENTRIES = [
  { label: 'Concrete', difference: -9000, running: -9000 },
  { label: 'Blocks', difference: 6000, running: -3000 },
  { label: 'Formwork', difference: 0, running: -3000 },
]
const SIZE = { id: 'l', widthPx: 300, rowPx: 54 }

function nodesOf(node: SvgNode): SvgNode[] {
  return [node, ...node.children.flatMap((child) => (typeof child === 'string' ? [] : nodesOf(child)))]
}

const byClass = (drawing: SvgNode, name: string) => nodesOf(drawing).filter(({ attributes }) => attributes['class'] === name)
const number = (node: SvgNode | undefined, name: string) => Number(node?.attributes[name])

describe('the difference ledger, drawn', () => {
  const drawing = ledgerDrawing(ENTRIES, SIZE)
  const { x } = ledgerScale(ENTRIES, SIZE.widthPx)

  it('starts every bar at zero, to the left where ribbed is cheaper and to the right where solid is', () => {
    const [ribbedCheaper] = byClass(drawing, 'ledger-bar-ribbed')
    const [solidCheaper] = byClass(drawing, 'ledger-bar-solid')
    expect(number(ribbedCheaper, 'x') + number(ribbedCheaper, 'width')).toBeCloseTo(x(0), 1)
    expect(number(solidCheaper, 'x')).toBeCloseTo(x(0), 1)
    expect(number(ribbedCheaper, 'width') / number(solidCheaper, 'width')).toBeCloseTo(9000 / 6000, 2)
  })

  it('draws no bar for what costs the same in both', () => {
    expect([...byClass(drawing, 'ledger-bar-ribbed'), ...byClass(drawing, 'ledger-bar-solid')]).toHaveLength(2)
  })

  it('steps the running total through a diamond on every row and fills the last', () => {
    const diamonds = byClass(drawing, 'ledger-diamond')
    expect(diamonds.map(({ attributes }) => attributes['fill'])).toEqual(['var(--paper)', 'var(--paper)', 'var(--ink)'])
    const [line] = byClass(drawing, 'ledger-running')
    expect(String(line?.attributes['d'])).toBe(`M${x(0)} 0V5H${x(-9000)}V40.5V59H${x(-3000)}V94.5V113H${x(-3000)}V148.5`)
  })

  it('is as high as the rows of the table beside it', () => {
    expect(drawing.attributes['height']).toBe(3 * 54)
  })

  it('names the side of each scheme only where the axis reaches', () => {
    const words = (entries: typeof ENTRIES) =>
      nodesOf(ledgerAxis(entries, SIZE)).flatMap(({ children }) => children.filter((child) => typeof child === 'string'))
    expect(words(ENTRIES)).toEqual(expect.arrayContaining(['ribbed cheaper', 'solid cheaper', '0']))
    expect(words([{ label: 'Concrete', difference: -20, running: -20 }])).not.toContain('solid cheaper')
  })
})

describe('ticks of an axis', () => {
  it('are round, evenly apart, cover the range and hold zero', () => {
    expect(niceTicks(-9380, 6876, 4)).toEqual([-10000, -5000, 0, 5000, 10000])
    expect(niceTicks(0, 0.37, 4)).toEqual([0, 0.1, 0.2, 0.3, 0.4])
  })

  it('stand even where nothing differs', () => {
    expect(niceTicks(0, 0, 4).length).toBeGreaterThanOrEqual(2)
  })
})

describe('an amount on an axis', () => {
  it.each([
    [0, '0'],
    [-10_000, '−10k'],
    [2500, '+2.5k'],
    [1_250_000, '+1.25M'],
    [-40, '−40'],
  ])('%d reads %s', (amount, text) => {
    expect(signedShort(amount)).toBe(text)
  })
})
