import { describe, expect, it } from 'vitest'
import { comparedFigures, steelTonnes, verdictOf } from '../../../src/components/compare/compareFigures'
import { costBySection } from '../../../src/components/compare/costBySection'
import { solidAdvantages } from '../../../src/components/compare/solidBetter'
import { verdictInWords } from '../../../src/components/compare/verdictInWords'
import { aFile } from '../../support/appraisalFileOf'
import { aCost, aResult } from '../../support/schemeResultOf'

const steel = aResult('ribbed', {
  quantities: [
    { item: 'steel.bar.12', unit: 't', net: 2, parts: [] },
    { item: 'steel.mesh.A142', unit: 'm²', net: 1000, parts: [] },
  ],
})
const figure = (key: string, ribbed = steel, solid = aResult('solid')) =>
  comparedFigures({ ribbed, solid }).find((one) => one.key === key)!

describe('what each scheme makes', () => {
  it('adds the mesh to the bars, A142 at the 2.22 kg/m² that BS 4483 prints', () => {
    expect(steelTonnes(steel)).toBeCloseTo(2 + 2.22, 9)
  })

  it('shows no money where a scheme is not priced', () => {
    const keys = comparedFigures({ ribbed: aResult('ribbed', { cost: null }), solid: aResult('solid', { cost: null }) })
    expect(keys.map(({ key }) => key)).not.toContain('total')
  })

  it('finds the smaller figure better and says by how much', () => {
    const deeper = figure('depth', aResult('ribbed', { depth: 250 }), aResult('solid', { depth: 200 }))
    expect(verdictOf(deeper)).toMatchObject({ better: 'solid', difference: 50 })
    expect(verdictInWords(verdictOf(deeper))).toBe('+25%, solid better')
  })

  it('calls figures that print the same the same', () => {
    const near = figure(
      'deadLoad',
      aResult('ribbed', { deadLoad: { perArea: 4.001, total: 1 } }),
      aResult('solid', { deadLoad: { perArea: 4.004, total: 1 } }),
    )
    expect(verdictInWords(verdictOf(near))).toBe('the same')
  })

  it('makes no judgement of a count of blocks', () => {
    const blocks = figure('blocks', aResult('ribbed', { quantities: [{ item: 'blocks.whole', unit: 'nr', net: 7, parts: [] }] }))
    expect(verdictOf(blocks)).toEqual({ better: 'neither', difference: 7, share: null })
  })
})

describe('where solid is the better floor', () => {
  const [specification] = aFile(['P1']).schemes

  it('claims for it only what this comparison computed, the rest as general cautions', () => {
    if (specification?.kind !== 'ribbed') throw new TypeError('expected a ribbed scheme')
    const figures = comparedFigures({ ribbed: aResult('ribbed', { depth: 250 }), solid: aResult('solid', { depth: 200 }) })
    const advantages = solidAdvantages(figures, specification)
    expect(advantages.filter(({ isComputed }) => isComputed)).toEqual([
      { name: 'Height', text: '50 mm less at every floor.', isComputed: true },
    ])
    expect(advantages.filter(({ isComputed }) => !isComputed).map(({ name }) => name)).toContain('Holes')
  })
})

describe('cost by work section', () => {
  it('takes markups together and leaves out what costs nothing in both', () => {
    const cost = aCost('1100.00', {
      lines: [{ item: 'concrete.slab', quantity: '10.00', unit: 'm³', rate: '100', amount: '1000.00' }],
      markups: [
        { name: 'preliminaries', percent: '5', amount: '50.00' },
        { name: 'contingency', percent: '4.7619', amount: '50.00' },
      ],
    })
    expect(costBySection({ ribbed: aResult('ribbed', { cost }), solid: aResult('solid') })).toEqual([
      { name: 'Concrete work', amounts: { ribbed: '1000', solid: '1000' } },
      { name: 'Preliminaries, contingency, tax', amounts: { ribbed: '100', solid: '0' } },
    ])
  })
})
