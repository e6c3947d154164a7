import { describe, expect, it } from 'vitest'
import { FIGURE_KEYS, type AlsoFigure, type FigureKey } from '#shared/alsoCompared/alsoFigure'
import type { AlsoCompared } from '#shared/alsoCompared/alsoCompared'
import { alsoRows } from '#shared/alsoCompared/alsoRows'

function schemeOf(kind: 'ribbed' | 'solid', given: Partial<Record<FigureKey, Partial<AlsoFigure>>>): AlsoCompared {
  const figures = FIGURE_KEYS.map((key) => ({ key, value: 1, working: '', source: 's', lacks: [], ...given[key] }))
  return { mark: kind === 'ribbed' ? 'R1' : 'S1', kind, figures, scope: [] }
}

function row(key: FigureKey, ribbed: Partial<AlsoFigure>, solid: Partial<AlsoFigure>) {
  return alsoRows(schemeOf('ribbed', { [key]: ribbed }), schemeOf('solid', { [key]: solid })).find((each) => each.key === key)!
}

describe('rows compared beside the cost', () => {
  it('come in the order they are read, each with a source', () => {
    const rows = alsoRows(schemeOf('ribbed', {}), schemeOf('solid', {}))
    expect(rows.map(({ key }) => key)).toEqual(FIGURE_KEYS)
  })

  it('call less dead load the better one, and more sound insulation', () => {
    expect(row('deadLoadArea', { value: 3 }, { value: 4 }).verdict).toBe('ribbed')
    expect(row('soundAir', { value: 49 }, { value: 54 }).verdict).toBe('solid')
    expect(row('soundImpact', { value: 79 }, { value: 74 }).verdict).toBe('solid')
  })

  it('say in a sentence with both figures where the ribbed floor is the worse one, and only there', () => {
    expect(row('soundAir', { value: 49.21 }, { value: 53.86 }).worse).toBe(
      'Airborne sound by mass, Rw: the ribbed floor is the worse one, 49.2 against 53.9 dB: less mass stops less sound, and hollows and a thin topping may take more away.',
    )
    expect(row('soundAir', { value: 58 }, { value: 53 }).worse).toBe('')
  })

  it('are the same where they are printed the same', () => {
    expect(row('deadLoadArea', { value: 3.001 }, { value: 3.004 }).verdict).toBe('same')
    expect(row('deadLoadArea', { value: 3.004 }, { value: 3.006 }).verdict).toBe('ribbed')
  })

  it('do not judge steel by the cubic metre, which flatters thick floors', () => {
    const judged = row('steelVolume', { value: 90 }, { value: 60 })
    expect(judged).toMatchObject({ verdict: null, notJudged: '', note: 'kg/m³ flatters thick floors.' })
  })

  it('do not judge carbon of different scope', () => {
    const judged = row('carbonProduct', { value: 20, lacks: ['blocks A1-A3'] }, { value: 30 })
    expect(judged).toMatchObject({ verdict: null, notJudged: 'Not like for like: R1 leaves out blocks A1-A3.' })
  })

  it('do not judge carbon without concrete or bars, but do without formwork in both', () => {
    const without = { lacks: ['concrete A1-A3'] }
    expect(row('carbonTotal', { value: 1, ...without }, { value: 2, ...without }).verdict).toBeNull()
    expect(row('carbonTotal', { value: 1, lacks: ['formwork'] }, { value: 2, lacks: ['formwork'] }).verdict).toBe('ribbed')
  })

  it('say for whom there is no figure', () => {
    expect(row('soundAir', { value: null }, { value: 54 })).toMatchObject({ verdict: null, notJudged: 'No figure for R1.' })
  })
})
