import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { appraise } from '#shared/appraise'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { type AppraisalFileInput, appraisalFile, type Beyond } from '#shared/contracts/appraisal'
import type { SizedPanel } from '#shared/sizing/sizedPanel'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { brief, edge, panelOf, rectangle, ribbed, row, schemeOf, solid } from '../support/floors'

type PanelInput = AppraisalFileInput['levels'][number]['panels'][number]

const schemes = [schemeOf({ ...ribbed, solidZone: 300, ribWidth: 140 }), schemeOf({ ...solid, thickness: 200 })]
const [ofRibs, ofSlab] = schemes as [(typeof schemes)[number], (typeof schemes)[number]]

function fileOf(panels: readonly PanelInput[]) {
  return appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief,
    levels: [{ mark: 'L1', panels }],
    schemes: [ribbed, { ...solid, thickness: 200 }],
  })
}

const sized = (panels: readonly PanelInput[], scheme = ofRibs) => sizeScheme(scheme, fileOf(panels)).panels

function withBeyond(panel: PanelInput, at: number, beyond: Beyond): PanelInput {
  return { ...panel, edges: panel.edges.map((each, i) => (i === at ? { ...each, beyond } : each)) }
}

const strip = ({ flags }: SizedPanel) => flags.find((flag) => flag.startsWith('analysed in the strip'))
const forces = ({ moments, steel }: SizedPanel) => ({ moments, steel })

/** 12 m across the span, so that slabs carry one way. */
const alone = (spanMm = 5500) => panelOf('P1', rectangle(0, 0, spanMm, 12_000), [1])

describe('a span typed behind an edge', () => {
  it.each([
    ['ribs', ofRibs],
    ['a slab', ofSlab],
  ])('gives %s other moments than the assumed equal span, unless it is as long', (_, scheme) => {
    const typed = sized([withBeyond(alone(), 1, { span: 4000 })], scheme)[0]!
    const assumed = sized([alone()], scheme)[0]!
    const equal = sized([withBeyond(alone(), 1, { span: 5500 })], scheme)[0]!
    expect(strip(typed)).toBe('analysed in the strip P1 – (4.0 m typed)')
    expect(typed.flags.join()).not.toContain('assumed')
    expect(assumed.flags.join()).toContain('an equal span is assumed')
    expect(typed.moments.support).toBeLessThan(assumed.moments.support)
    // The assumed span is the panel's own effective one; the typed one is on support lines.
    expect(equal.moments.support / assumed.moments.support).toBeCloseTo(1, 1)
    expect(strip(sized([withBeyond(alone(), 1, { span: 6250 })], scheme)[0]!)).toBe('analysed in the strip P1 – (6.25 m typed)')
  })

  it('comes before the panel that is drawn there, for that panel alone', () => {
    const [first, second] = row([5500, 5500], 12_000)
    const [typed, other] = sized([withBeyond(first!, 1, { span: 3000 }), second!])
    expect(strip(typed!)).toBe('analysed in the strip P1 – (3.0 m typed)')
    expect(strip(other!)).toBe('analysed in the strip P1 – P2')
  })

  it('is said to make no difference where the panel is in no strip', () => {
    const beside = panelOf('P1', rectangle(0, 0, 5500, 6000), [2])
    const flags = sized([withBeyond(beside, 2, { span: 6000 })])[0]!.flags.join()
    expect(flags).toContain('edge 3: what was typed to go on behind makes no difference')
    expect(sized([withBeyond(beside, 2, { span: 6000 })], ofSlab)[0]!.flags.join()).toContain('edge 3: what was typed')
  })
})

describe('a panel named behind an edge', () => {
  /** P1, and behind its right edge P2 along 7 m of it and P3, a longer span, along 5 m. */
  const panels = [
    panelOf('P1', rectangle(0, 0, 5500, 12_000), [1]),
    panelOf('P2', rectangle(5500, 0, 5000, 7000), [3]),
    panelOf('P3', rectangle(5500, 7000, 7500, 5000), [3]),
  ]

  it('takes the place of the one with the longest common support', () => {
    const found = sized(panels)[0]!
    const named = sized([withBeyond(panels[0]!, 1, { panel: 'P3' }), ...panels.slice(1)])[0]!
    expect(strip(found)).toBe('analysed in the strip P1 – P2')
    expect(strip(named)).toBe('analysed in the strip P1 – P3')
    const same = sized([withBeyond(panels[0]!, 1, { panel: 'P2' }), ...panels.slice(1)])[0]!
    expect(forces(same)).toEqual(forces(found))
  })

  it('that spans the other way leaves an assumed span, and says so', () => {
    const turned = { ...panels[2]!, ribDirection: 90 }
    const named = sized([withBeyond(panels[0]!, 1, { panel: 'P3' }), panels[1]!, turned])[0]!
    expect(named.flags.join()).toContain('an equal span is assumed')
  })

  it.each<[string, number, Beyond, string, RegExp]>([
    ['is not of the level', 1, { panel: 'P9' }, 'levels.0.panels.0.edges.1.beyond.panel', /expected one of the panels .* P2, P3/],
    [
      'does not stand on the edge',
      1,
      { panel: 'P1' },
      'levels.0.panels.0.edges.1.beyond.panel',
      /P1 does not stand on this edge/,
    ],
    ['stands behind a discontinuous edge', 0, { panel: 'P2' }, 'levels.0.panels.0.edges.0.beyond', /expected a continuous one/],
    ['is a span behind a discontinuous edge', 0, { span: 5000 }, 'levels.0.panels.0.edges.0.beyond', /discontinuous edge/],
  ])('is refused with its path where it %s', (_, at, beyond, path, message) => {
    const refused = () => appraise(fileOf([withBeyond(panels[0]!, at, beyond), ...panels.slice(1)]))
    try {
      refused()
      expect.unreachable()
    } catch (error) {
      expect(error).toBeInstanceOf(AppraisalRefusedError)
      const { issues } = error as AppraisalRefusedError
      expect(issues.map((issue) => issue.path)).toEqual([path])
      expect(issues[0]!.message).toMatch(message)
    }
  })

  it('serves all sides where one entry does, and is refused unless it stands on them all', () => {
    const all = { ...panels[0]!, edges: [{ ...edge('continuous'), beyond: { panel: 'P2' } }] }
    expect(() => appraise(fileOf([all, ...panels.slice(1)]))).toThrow(AppraisalRefusedError)
    const typed = { ...panels[0]!, edges: [{ ...edge('continuous'), beyond: { span: 4000 } }] }
    expect(strip(sized([typed])[0]!)).toBe('analysed in the strip (4.0 m typed) – P1 – (4.0 m typed)')
  })
})

describe('the strips of a level', () => {
  it('are the rows of any grid, with one moment at each support', () => {
    const widths = fc.array(fc.integer({ min: 34, max: 70 }), { minLength: 1, maxLength: 5 })
    const heights = fc.array(fc.integer({ min: 30, max: 60 }), { minLength: 1, maxLength: 3 })
    fc.assert(
      fc.property(widths, heights, (columns, rows) => {
        const at = (of: readonly number[], i: number) => 100 * of.slice(0, i).reduce((sum, each) => sum + each, 0)
        const panels = rows.flatMap((height, r) =>
          columns.map((width, c) => {
            const isContinuous = [r > 0, c < columns.length - 1, r < rows.length - 1, c > 0]
            const continuous = isContinuous.flatMap((is, i) => (is ? [i] : []))
            return panelOf(`R${r}C${c}`, rectangle(at(columns, c), at(rows, r), 100 * width, 100 * height), continuous)
          }),
        )
        const found = sized(panels)
        rows.forEach((_, r) => {
          const marks = columns.map((__, c) => `R${r}C${c}`)
          const row = found.slice(r * columns.length, (r + 1) * columns.length)
          const expected = columns.length > 1 ? `analysed in the strip ${marks.join(' – ')}` : undefined
          expect(row.map(strip)).toEqual(row.map(() => expected))
          const hogs = row.map(({ moments }) => moments.support)
          if (columns.length === 2) expect(hogs[0]).toBeCloseTo(hogs[1]!, 9)
          if (columns.length === 1) expect(hogs[0]).toBe(0)
        })
      }),
      { numRuns: 25 },
    )
  })
})
