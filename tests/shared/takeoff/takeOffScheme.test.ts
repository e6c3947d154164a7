import { describe, expect, it } from 'vitest'
import type { ItemCode, Level, Scheme } from '#shared/contracts/appraisal'
import type { Quantity } from '#shared/contracts/appraisalResult'
import { quantity as quantityContract } from '#shared/contracts/appraisalResult'
import { unitOf } from '#shared/takeoff/measurementRules'
import { comparingRules } from '#shared/takeoff/rules/comparingRules'
import { takeOffScheme } from '#shared/takeoff/takeOffScheme'
import { evaluate } from '../support/evaluate'
import { barRun, handSized, levelOf, rectangle, ribbedOf, solidOf } from '../support/handSized'

const ARITHMETIC = 1e-9

const takeOff = (scheme: Scheme, levels: readonly Level[], bars: Parameters<typeof handSized>[2] = []) =>
  takeOffScheme(scheme, handSized(scheme, levels, bars), levels, comparingRules, 'EN1992')
const find = (quantities: readonly Quantity[], item: ItemCode) => quantities.find((quantity) => quantity.item === item)
const netOf = (quantities: readonly Quantity[], item: ItemCode) => find(quantities, item)?.net ?? 0
const sumOf = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0)

const bay = levelOf({ outline: rectangle(0, 0, 6600, 6000) })

describe('a ribbed bay of 6.6 by 6.0 m', () => {
  // clear 6350 across the ribs, 5750 along: (6350 + 100) / 500 = 12 rows; (5750 - 2 * 200) / 200 = 26 blocks in each
  const quantities = takeOff(ribbedOf(), [bay])

  it.each([
    ['blocks.whole', 12 * 26],
    ['blocks.closedEnds', 12 * 2],
    ['concrete.slab', Number((6.35 * 5.75 * 0.25 - 12 * 26 * 0.2 * 0.4 * 0.2).toFixed(2))],
    ['steel.mesh.A142', Number((6.35 * 5.75).toFixed(2))],
    ['formwork.soffit', Number((6.35 * 5.75).toFixed(2))],
    ['curing.area', Number((6.35 * 5.75).toFixed(2))],
    ['propping.area', Number((6.35 * 5.75).toFixed(2))],
  ] as const)('takes %s %d', (item, net) => {
    expect(netOf(quantities, item)).toBe(net)
  })

  it('shows how each figure comes about', () => {
    expect(find(quantities, 'concrete.slab')!.parts).toEqual([
      { level: 'L1', panel: 'P1', expression: '6.35 * 5.75 * 0.25 - 312 * 0.2 * 0.4 * 0.2', value: expect.closeTo(4.136125, 9) },
    ])
    expect(find(quantities, 'formwork.soffit')!.parts[0]!.expression).toBe('6.35 * 5.75')
  })

  it('names nothing that it does not take', () => {
    const items = quantities.map(({ item }) => item)
    expect(items).not.toContain('blocks.cut')
    expect(items).not.toContain('formwork.edge')
    expect(items.filter((item) => item.startsWith('steel.bar'))).toEqual([])
    expect(takeOff(ribbedOf({ mesh: 'none' }), [bay]).some(({ item }) => item.startsWith('steel.mesh'))).toBe(false)
  })

  it('counts cut blocks apart and takes their volume off the concrete', () => {
    const cut = takeOff(ribbedOf({ cutBlocks: true, solidZone: 125 }), [bay])
    // 5750 - 250 = 5500 = 27 blocks and a piece of 50 at either end
    expect(netOf(cut, 'blocks.whole')).toBe(12 * 27)
    expect(netOf(cut, 'blocks.cut')).toBe(24)
    expect(find(cut, 'concrete.slab')!.parts[0]!.expression).toBe('6.35 * 5.75 * 0.25 - (324 * 0.2 + 1.2) * 0.4 * 0.2')
  })
})

describe('bars', () => {
  const bars = [barRun(12, 26, 5990), barRun(12, 10, 2100), barRun(8, 13, 1500)]

  it('are weighed by diameter with the printed mass, one part for each run', () => {
    const quantities = takeOff(ribbedOf(), [{ ...bay, repeat: 4 }], bars)
    const twelve = find(quantities, 'steel.bar.12')!
    expect(twelve.net).toBe(Number((((26 * 5.99 + 10 * 2.1) * 0.888 * 4) / 1000).toFixed(3)))
    expect(twelve.parts.map(({ expression }) => expression)).toEqual([
      '26 * 5.99 * 0.888 / 1000 * 4',
      '10 * 2.1 * 0.888 / 1000 * 4',
    ])
    expect(netOf(quantities, 'steel.bar.8')).toBe(Number(((13 * 1.5 * 0.395 * 4) / 1000).toFixed(3)))
  })
})

describe('voids', () => {
  const stair = rectangle(2000, 1000, 2600, 3600) // 9.36 m²
  const shaft = rectangle(5000, 1000, 1000, 500) // 0.5 m²
  const level = levelOf({ outline: rectangle(0, 0, 6600, 6000), voids: [stair, shaft] })
  const quantities = takeOff(solidOf(160), [level])

  it('come off the concrete, off the soffit only above 5 m²', () => {
    expect(find(quantities, 'concrete.slab')!.parts[0]!.expression).toBe('(6.35 * 5.75 - 2.6 * 3.6 - 1 * 0.5) * 0.16')
    expect(find(quantities, 'formwork.soffit')!.parts[0]!.expression).toBe('6.35 * 5.75 - 2.6 * 3.6')
    expect(netOf(quantities, 'curing.area')).toBe(26.65) // 36.5125 - 9.36 - 0.5 = 26.6525
  })

  it('count only as far as the support faces, to which they may miss by a fit', () => {
    const past = levelOf({ outline: rectangle(0, 0, 6600, 6000), voids: [rectangle(124.6, 1000, 2000, 1500)] })
    const [concrete] = takeOff(solidOf(160), [past])
    expect(concrete!.parts[0]!.value).toBeCloseTo((6.35 * 5.75 - 1.9996 * 1.5) * 0.16, 9)
    expect(concrete!.split!.slab).toBeCloseTo(concrete!.parts[0]!.value, 9)
  })

  it('are formed all round', () => {
    expect(find(quantities, 'formwork.edge')!.parts[0]!.expression).toBe('2 * (2.6 + 3.6) + 2 * (1 + 0.5)')
    expect(netOf(quantities, 'formwork.edge')).toBe(15.4)
  })

  it('stay in where the rules in force leave small ones in', () => {
    const scheme = solidOf(160)
    const rules = { ...comparingRules, deductVoidsOver: { ...comparingRules.deductVoidsOver, concreteM3: 0.1 } }
    const [concrete] = takeOffScheme(scheme, handSized(scheme, [level]), [level], rules, 'EN1992')
    expect(concrete!.parts[0]!.expression).toBe('(6.35 * 5.75 - 2.6 * 3.6) * 0.16') // the shaft is 0.08 m³
    expect(sumOf(Object.values(concrete!.split!))).toBeCloseTo(concrete!.parts[0]!.value, 9)
  })
})

describe('free edges and walls', () => {
  const edges = (kind: 'beam' | 'wall') => [
    { supportWidth: 0, kind: 'beam' as const, continuity: 'free' as const },
    { supportWidth: 250, kind, continuity: 'discontinuous' as const },
    { supportWidth: 250, kind, continuity: 'discontinuous' as const },
    { supportWidth: 250, kind, continuity: 'discontinuous' as const },
  ]

  it('form a free edge between the faces of beams', () => {
    const quantities = takeOff(solidOf(160), [levelOf({ outline: rectangle(0, 0, 6600, 6000), edges: edges('beam') })])
    expect(netOf(quantities, 'formwork.edge')).toBe(6.35)
    expect(netOf(quantities, 'concrete.slab')).toBe(Number((6.35 * 5.875 * 0.16).toFixed(2)))
  })

  it('carry floor and free edge over walls to their outer faces', () => {
    const quantities = takeOff(solidOf(160), [levelOf({ outline: rectangle(0, 0, 6600, 6000), edges: edges('wall') })])
    expect(netOf(quantities, 'formwork.edge')).toBe(6.85)
    expect(netOf(quantities, 'concrete.slab')).toBe(Number((6.85 * 6.125 * 0.16).toFixed(2)))
    expect(netOf(quantities, 'formwork.soffit')).toBe(Number((6.35 * 5.875).toFixed(2)))
  })
})

describe('every quantity', () => {
  const skew: [number, number][] = [
    [6600, 0],
    [12600, 0],
    [11100, 6000],
    [6600, 6000],
  ]
  const level = levelOf(
    {
      outline: rectangle(0, 0, 6600, 6000),
      repeat: 3,
      edges: [{ supportWidth: 230, kind: 'wall', continuity: 'continuous' }],
      voids: [rectangle(3000, 2000, 900, 1100)],
    },
    { outline: skew, ribDirection: 0, edges: [{ supportWidth: 250, kind: 'beam', continuity: 'continuous' }] },
  )
  const levels = [level, { ...level, mark: 'L2', repeat: 7 }]
  const schemes = [ribbedOf({ cutBlocks: true, leastPiece: 80, edgeStrip: 60 }), solidOf(175)]

  it.each(schemes)('of a $kind scheme evaluates to its value and adds up to its net', (scheme) => {
    for (const quantity of takeOff(scheme, levels, [barRun(16, 22, 6123.456), barRun(10, 7, 1999.9)])) {
      const { item, unit, net, parts, split } = quantityContract.parse(quantity)
      for (const { expression, value } of parts) {
        expect(expression).toMatch(/^[\d.+\-*/() ]+$/)
        expect(Math.abs(evaluate(expression) - value)).toBeLessThanOrEqual(ARITHMETIC * value)
      }
      const whole = sumOf(parts.map(({ value }) => value))
      expect(unit).toBe(unitOf(item))
      expect(Math.abs(net - whole)).toBeLessThanOrEqual(0.5 * 10 ** -comparingRules.decimals[unit] + ARITHMETIC * whole)
      if (split) expect(Math.abs(sumOf(Object.values(split)) - whole)).toBeLessThanOrEqual(ARITHMETIC * whole)
      expect(split !== undefined).toBe(item === 'concrete.slab')
    }
  })

  it.each(schemes)('of a $kind scheme scales with the repeats of panel and level', (scheme) => {
    const once = takeOff(scheme, [bay], [barRun(12, 5, 3333)])
    const repeated = { ...bay, repeat: 5, panels: bay.panels.map((panel) => ({ ...panel, repeat: 3 })) }
    takeOff(scheme, [repeated], [barRun(12, 5, 3333)]).forEach(({ item, parts }, index) => {
      expect(item).toBe(once[index]!.item)
      expect(parts[0]!.value).toBeCloseTo(15 * once[index]!.parts[0]!.value, 9)
      expect(parts[0]!.expression).toMatch(/ \* 3 \* 5$/)
    })
  })

  it('refuses a scheme that was sized over other levels', () => {
    const scheme = solidOf(160)
    expect(() => takeOffScheme(scheme, handSized(scheme, [bay]), levels, comparingRules, 'EN1992')).toThrow(RangeError)
    expect(() => takeOffScheme(scheme, handSized(scheme, [bay]), [{ ...bay, mark: 'L9' }], comparingRules, 'EN1992')).toThrow(
      /L9 P1/,
    )
  })
})
