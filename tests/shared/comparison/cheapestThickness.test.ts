import { describe, expect, it } from 'vitest'
import { appraise } from '#shared/appraise'
import { cheapestThickness } from '#shared/comparison/cheapestThickness'
import { type AppraisalFile, appraisalFile, type AppraisalFileInput } from '#shared/contracts/appraisal'
import { brief, row } from '../sizing/support/floors'

const MOST_TRIED_MM = 600

const bars = { 8: '1400', 10: '1380', 12: '1350', 16: '1340', 20: '1340', 25: '1340' }
const steelAt = (factor: number) =>
  Object.fromEntries(Object.entries(bars).map(([diameter, rate]) => [`steel.bar.${diameter}`, String(Number(rate) * factor)]))

type Items = NonNullable<AppraisalFileInput['rates']>['items']

function priced(items: Items | null, panels = row([5600, 4200], 5200)): AppraisalFile {
  return appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief,
    levels: [{ mark: 'L1', panels }],
    schemes: [{ mark: 'S1', kind: 'solid', thickness: 'least' }],
    ...(items ? { rates: { currency: 'USD', items, markups: { preliminariesPercent: '10', taxPercent: '7' } } } : {}),
  })
}

/** The cheapest of every thickness in 5 mm steps whose checks all pass, tried one by one. */
function bruteForce(file: AppraisalFile): { thickness: number; total: number } {
  const [scheme] = file.schemes
  if (scheme?.kind !== 'solid') throw new RangeError('expected a solid scheme')
  let best = { thickness: 0, total: Infinity }
  for (let thickness = 100; thickness <= MOST_TRIED_MM; thickness += 5) {
    const result = appraise({ ...file, schemes: [{ ...scheme, thickness }] }).schemes[0]!
    const total = Number(result.cost!.total)
    if (result.passes && total < best.total) best = { thickness, total }
  }
  return best
}

describe('cheapestThickness', () => {
  it.each([
    ['steel at a usual rate', { 'concrete.slab': '140', 'formwork.soffit': '22', ...steelAt(1) }],
    ['dear steel', { 'concrete.slab': '90', 'formwork.soffit': '22', ...steelAt(4) }],
    ['very dear steel', { 'concrete.slab': '60', ...steelAt(9) }],
    ['dear concrete', { 'concrete.slab': '400', 'formwork.soffit': '22', ...steelAt(0.5) }],
  ] as const)('is what trying every thickness finds, with %s', (_name, items) => {
    const file = priced(items)
    const choice = cheapestThickness(file, 'S1', appraise)
    const expected = bruteForce(file)
    expect(choice.by).toBe('cost')
    expect(choice.thicknessMm).toBe(expected.thickness)
    expect(Number(choice.trials.find(({ thicknessMm }) => thicknessMm === choice.thicknessMm)!.total)).toBe(expected.total)
    expect(choice.note).toContain(`${expected.thickness} mm`)
  })

  it('is thicker than the least where steel is dear', () => {
    const dear = cheapestThickness(priced({ 'concrete.slab': '60', ...steelAt(9) }), 'S1', appraise)
    expect(dear.thicknessMm).toBeGreaterThan(dear.trials[0]!.thicknessMm)
  })

  it('takes the least and says why, without rates or without a rate for what changes with thickness', () => {
    const [without, part] = [priced(null), priced({ 'concrete.slab': '140', 'steel.bar.8': '1400' })].map((file) =>
      cheapestThickness(file, 'S1', appraise),
    )
    const least = appraise(priced(null)).schemes[0]!.depth
    expect(without).toMatchObject({ by: 'least', thicknessMm: least, unpriced: [] })
    expect(without!.note).toContain('no rates')
    expect(part).toMatchObject({ by: 'least', thicknessMm: least })
    expect(part!.unpriced).toContain('steel.bar.10')
    expect(part!.note).toContain('steel.bar.10')
  })

  it('is not kept from a thickness by fire cover, which no thickness mends', () => {
    const items = { 'concrete.slab': '60', ...steelAt(9) }
    const file = priced(items)
    const hot = { ...file, brief: { ...file.brief, fireMinutes: 180 as const } }
    const choice = cheapestThickness(hot, 'S1', appraise)
    expect(choice.trials.some(({ passes }) => passes)).toBe(true)
    expect(choice.thicknessMm).toBeGreaterThan(choice.trials[0]!.thicknessMm)
  })

  it('names a mark that is no solid scheme', () => {
    expect(() => cheapestThickness(priced(null), 'R1', appraise)).toThrow(RangeError)
  })
})
