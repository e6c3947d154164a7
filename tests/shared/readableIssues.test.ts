import { describe, expect, it } from 'vitest'
import { appraisalFile } from '#shared/contracts/appraisal'
import { readableIssues } from '#shared/readableIssues'

const panel = {
  mark: 'P1',
  outline: [
    [0, 0],
    [6000, 0],
    [6000, 4500],
    [0, 4500],
  ],
  edges: [{ supportWidth: 250, continuity: 'discontinuous' }],
  ribDirection: 90,
}
const ribbed = {
  mark: 'R1',
  kind: 'ribbed',
  block: { length: 200, width: 400, height: 200, mass: 12 },
  ribWidth: 100,
  topping: 50,
  solidZone: 200,
}
const sound = {
  format: 'bothways.appraisal/1',
  brief: { basis: 'EN1992', imposedLoad: 2, cover: 25, fireMinutes: 60, fck: 30, fyk: 500 },
  levels: [{ mark: 'L1', panels: [panel] }],
  schemes: [ribbed],
  rates: { currency: 'USD', items: { 'concrete.slab': '150' } },
}

const issuesOf = (value: unknown) => readableIssues(appraisalFile.safeParse(value).error?.issues ?? [], value)
const withBrief = (changes: object) => ({ ...sound, brief: { ...sound.brief, ...changes } })
const withLevel = (changes: object) => ({ ...sound, levels: [{ ...sound.levels[0], ...changes }] })
const withPanel = (changes: object) => withLevel({ panels: [{ ...panel, ...changes }] })
const withScheme = (changes: object) => ({ ...sound, schemes: [{ ...ribbed, ...changes }] })
const withRates = (changes: object) => ({ ...sound, rates: { ...sound.rates, ...changes } })

describe('what a contract refuses, in words', () => {
  it('accepts the sound file', () => {
    expect(issuesOf(sound)).toEqual([])
  })

  it.each([
    ['text in a number', withBrief({ cover: '25' }), 'brief.cover', 'expected a number, got "25"'],
    ['not a number', withBrief({ imposedLoad: NaN }), 'brief.imposedLoad', 'expected a number, got NaN'],
    ['infinity', withBrief({ imposedLoad: Infinity }), 'brief.imposedLoad', 'expected a number, got Infinity'],
    ['null', withBrief({ imposedLoad: null }), 'brief.imposedLoad', 'expected a number, got null'],
    ['a missing field', withBrief({ fck: undefined }), 'brief.fck', 'expected a number, got nothing'],
    ['too little', withBrief({ fck: 5 }), 'brief.fck', 'expected a number of at least 12, got 5'],
    ['too much', withLevel({ repeat: 1e9 }), 'levels.0.repeat', 'expected a number of at most 1000, got 1000000000'],
    ['half a repeat', withPanel({ repeat: 1.5 }), 'levels.0.panels.0.repeat', 'expected a whole number, got 1.5'],
    [
      'an open limit',
      withPanel({ ribDirection: 180 }),
      'levels.0.panels.0.ribDirection',
      'expected a number of less than 180, got 180',
    ],
    ['a choice', withBrief({ fireMinutes: 45 }), 'brief.fireMinutes', 'expected 0, 30, 60, 90, 120, 180 or 240, got 45'],
    ['a basis', withBrief({ basis: 'X' }), 'brief.basis', 'expected "EN1992" or "BS8110", got "X"'],
    ['a missing basis', withBrief({ basis: undefined }), 'brief.basis', 'expected "EN1992" or "BS8110", got nothing'],
    ['an unknown field', withBrief({ height: 3 }), 'brief.height', 'unknown field: expected no such name here'],
    ['an empty mark', withPanel({ mark: '' }), 'levels.0.panels.0.mark', 'expected text of at least 1 character, got ""'],
    [
      'a mark with spaces',
      withPanel({ mark: 'P 1' }),
      'levels.0.panels.0.mark',
      'expected a mark of letters, digits, ".", "_" or "-", as "P1", got "P 1"',
    ],
    [
      'two corners',
      withPanel({ outline: panel.outline.slice(2) }),
      'levels.0.panels.0.outline',
      'expected a list of at least 3, got a list of 2',
    ],
    [
      'half a corner',
      withPanel({ outline: [[0], ...panel.outline] }),
      'levels.0.panels.0.outline.0',
      'expected a list of at least 2, got a list of 1',
    ],
    ['a wrong alternative', withScheme({ solidZone: 'wide' }), 'schemes.0.solidZone', 'expected a number or "least", got "wide"'],
    [
      'a right alternative out of range',
      withScheme({ solidZone: -5 }),
      'schemes.0.solidZone',
      'expected a number of at least 0, got -5',
    ],
    [
      'a fault inside an alternative',
      withScheme({ ribBars: [{ diameter: 13, count: 2 }] }),
      'schemes.0.ribBars.0.diameter',
      'expected 6, 8, 10, 12, 16, 20, 25, 32 or 40, got 13',
    ],
    [
      'cross ribs',
      withScheme({ crossRibs: { every: 3, width: 100 } }),
      'schemes.0.crossRibs.every',
      'expected a number of at least 500, got 3',
    ],
    ['no scheme', { ...sound, schemes: [] }, 'schemes', 'expected a list of at least 1, got a list of 0'],
    [
      'a currency',
      withRates({ currency: 'usd' }),
      'rates.currency',
      'expected a currency code of three capital letters, as "USD", got "usd"',
    ],
    ['a rate as number', withRates({ items: { 'concrete.slab': 150 } }), 'rates.items.concrete.slab', 'expected text, got 150'],
    [
      'a negative rate',
      withRates({ items: { 'concrete.slab': '-1' } }),
      'rates.items.concrete.slab',
      'expected a decimal number as text, not negative, at most six decimals, as "149.63", got "-1"',
    ],
    [
      'an unknown item',
      withRates({ items: { 'gold.bar': '1' } }),
      'rates.items.gold.bar',
      'unknown field: expected no such name here',
    ],
    ['another format', { ...sound, format: 'x/1' }, 'format', 'expected "bothways.appraisal/1", got "x/1"'],
    ['no object at all', 7, '', 'expected an object, got 7'],
    ['a long text', withBrief({ cover: 'x'.repeat(99) }), 'brief.cover', `expected a number, got "${'x'.repeat(40)}…"`],
  ])('%s', (_what, file, path, message) => {
    expect(issuesOf(file)).toEqual([{ path, message }])
  })

  it('names every wrong field, each once', () => {
    const issues = issuesOf({ ...withBrief({ cover: 1, fck: 'x', a: 1, b: 2 }), levels: [] })
    expect(issues.map(({ path }) => path)).toEqual(['brief.cover', 'brief.fck', 'brief.a', 'brief.b', 'levels'])
  })

  it('takes time in proportion to how much is wrong: a body of unknown fields holds nobody up', { timeout: 20_000 }, () => {
    const many = Object.fromEntries(Array.from({ length: 150_000 }, (_, index) => [`f${index}`, 1]))
    expect(issuesOf({ ...sound, ...many })).toHaveLength(150_000)
  })

  it('lets no key reach a prototype', () => {
    const file: unknown = JSON.parse(JSON.stringify(sound).replace('"concrete.slab":"150"', '"__proto__":{"polluted":"1"}'))
    const items = appraisalFile.parse(file).rates!.items
    expect([Object.keys(items), Reflect.get(items, 'polluted'), Reflect.get({}, 'polluted')]).toEqual([[], undefined, undefined])
    expect(issuesOf(JSON.parse('{"__proto__":{"format":"bothways.appraisal/1"}}')).map(({ path }) => path)).toContain('format')
  })
})
