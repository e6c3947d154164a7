import { describe, expect, it } from 'vitest'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { fileOf, panelOf, rectangle, ribbed, row, schemeOf } from '../support/floors'

const scheme = schemeOf({ ...ribbed, solidZone: 300, ribWidth: 140 })
const COEFFICIENTS = /Table 3\.12 \(3\.5\.2\.3 holds/
const ELASTIC = /elastic continuous beam/

function sized(...args: Parameters<typeof fileOf>) {
  return sizeScheme(scheme, fileOf(...args)).panels
}

/** Moment coefficients of a panel: moment a rib over F·l a rib, from its own load and effective span (deep ribs: half the support). */
function coefficients(widths: readonly number[], index: number, height = 6000) {
  const panel = sized(row(widths, height))[index]!
  const { clear, voids, blocks } = panel.areas
  const blocksM3 = (blocks / 1e6) * 0.2
  const selfWeight = (((clear - voids) / 1e6) * 0.26 * 25 - blocksM3 * 25 + (blocksM3 / 0.016) * 12.5 * 0.00981) / (clear / 1e6)
  const unit = (1.35 * (selfWeight + 1.5) + 1.5 * 2.8) * 0.54 * (widths[index]! / 1000) ** 2
  return [panel.moments.midspan / unit, panel.moments.support / unit]
}

describe('panels in a row', () => {
  it('are one strip by coefficients where bays are large and spans about equal', () => {
    const panels = sized(row([5500, 5500, 5500, 5500], 6000))
    expect(panels.every(({ flags }) => COEFFICIENTS.test(flags[0]!))).toBe(true)
    const [end, interior] = [0, 1].map((index) => coefficients([5500, 5500, 5500, 5500], index))
    expect(end![0]).toBeCloseTo(0.086, 6)
    expect(end![1]).toBeCloseTo(0.086, 6)
    expect(interior![0]).toBeCloseTo(0.063, 6)
    expect(interior![1]).toBeCloseTo(0.086, 6)
  })

  it('have 0.063 at supports that are not next to an end span', () => {
    const widths = [5500, 5500, 5500, 5500, 5500]
    expect(coefficients(widths, 2)[1]).toBeCloseTo(0.063, 6)
  })

  it('go to elastic analysis under each condition that fails', () => {
    const flag = (...args: Parameters<typeof fileOf>) => sized(...args)[0]!.flags[0]!
    expect(flag(row([5500, 5500, 5500], 6000))).toMatch(COEFFICIENTS)
    expect(flag(row([5500, 5500], 6000))).toMatch(ELASTIC)
    expect(flag(row([5500, 5500, 5500], 5400))).toMatch(ELASTIC)
    expect(flag(row([5500, 4600, 5500], 7000))).toMatch(ELASTIC)
    expect(flag(row([5500, 5500, 5500], 6000), { imposedLoad: 5.1, finishesLoad: 3 })).toMatch(ELASTIC)
    expect(flag(row([5500, 5500, 5500], 6000), { imposedLoad: 4.5, finishesLoad: 3, partitionsLoad: 2 })).toMatch(COEFFICIENTS)
    expect(flag(row([5500, 5500, 5500], 6000), { imposedLoad: 4.9, finishesLoad: 0, partitionsLoad: 2 })).toMatch(ELASTIC)
  })

  it('count a bay over the panels side by side', () => {
    const above = row([5500, 5500, 5500], 3000).map((panel, i) => ({
      ...panel,
      mark: `Q${i + 1}`,
      outline: panel.outline.map(([x, y]): [number, number] => [x, y + 3000]),
    }))
    expect(sized(row([5500, 5500, 5500], 3000))[0]!.flags[0]).toMatch(ELASTIC)
    expect(sized([...row([5500, 5500, 5500], 3000), ...above])[0]!.flags[0]).toMatch(COEFFICIENTS)
  })

  it('take an equal span behind a continuous edge without a neighbour, and say so', () => {
    const alone = sized([panelOf('P1', rectangle(0, 0, 5500, 6000), [1])])[0]!
    expect(alone.flags.join()).toContain('an equal span is assumed')
    const [first] = sized(row([5500, 5500], 6000))
    expect(alone.moments.support).toBeCloseTo(first!.moments.support, 9)
    expect(alone.moments.midspan).toBeCloseTo(first!.moments.midspan, 9)
  })

  it('do not run on across a neighbour whose ribs run the other way', () => {
    const [first, second] = row([5500, 5500], 6000)
    const turned = sized([first!, { ...second!, ribDirection: 90 }])[0]!
    expect(turned.flags.join()).toContain('an equal span is assumed')
  })

  it('have the same moment on both sides of a support', () => {
    const [first, second] = sized(row([5800, 4200], 6000))
    expect(first!.moments.support).toBeCloseTo(second!.moments.support, 9)
  })
})
