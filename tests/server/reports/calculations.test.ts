import { describe, expect, it } from 'vitest'
import { calculationOf } from '#shared/calculation/calculationOf'
import { appraisalFile } from '#shared/contracts/appraisal'
import { frozenComparison } from '../../../server/reports/frozenComparison'
import { reportPage } from '../../../server/reports/reportPage'
import { doAppraisalJob } from '../../../server/services/appraisal/doAppraisalJob'
import { loads, ribbed, row, solid } from '../../shared/sizing/support/floors'
import { frozenExample } from './frozenExample'

const file = appraisalFile.parse({
  format: 'bothways.appraisal/1',
  brief: { basis: 'EN1992', ...loads, fireMinutes: 60, fck: 30, fyk: 500 },
  levels: [{ mark: 'L1', panels: row([6600, 5000], 6200, 90) }],
  schemes: [ribbed, solid],
})
const outcome = doAppraisalJob({ kind: 'compared', file })
if (outcome.kind !== 'compared') throw new Error(`expected a comparison, got ${outcome.kind}`)
const { appraisal, calculations } = outcome
const frozen = frozenExample({ calculations: [...calculations] })
const textOf = (document: string) =>
  document
    .replace(/<style>[\s\S]*?<\/style>/, '')
    .replace(/<[^>]*>/g, ' ')
    .replace(/\s+/g, ' ')

describe('the calculation in the report', () => {
  it('is of the panel with the tightest check of each scheme', () => {
    for (const [at, { scheme, level, panel }] of calculations.entries()) {
      const { mark, checks } = appraisal.schemes[at]!
      const tightest = checks.filter(({ pass }) => pass === checks.every((check) => check.pass))
      const most = Math.max(...tightest.map(({ utilisation }) => utilisation))
      expect(scheme).toBe(mark)
      expect(tightest.find(({ utilisation }) => utilisation === most)).toMatchObject({ level, panel })
      expect(calculations[at]).toEqual(calculationOf(file, { scheme, level, panel }))
    }
  })

  it('prints every line: clause, formula, numbers, result, and how much is used', () => {
    const shown = textOf(reportPage(frozen).document)
    for (const { sections } of calculations) {
      for (const { clause, lines, check } of sections.flatMap(({ entries }) => entries)) {
        expect(shown).toContain(clause)
        if (check) expect(shown).toContain(`${check.utilisation.toFixed(2)} ${check.pass ? 'passes' : 'fails'}`)
        expect(lines.length).toBeGreaterThan(0)
      }
    }
    expect(shown).toMatch(/n = γG·gk \+ γQ·qk = [\d.]+·[\d.]+ \+ [\d.]+·[\d.]+ = [\d.]+ kN/)
  })

  it('survives being stored, and is absent from what was sent before', () => {
    expect(frozenComparison.parse(JSON.parse(JSON.stringify(frozen)))).toEqual(JSON.parse(JSON.stringify(frozen)))
    expect(textOf(reportPage(frozenExample()).document)).not.toContain('Calculation of')
  })

  it('is text, whatever a mark or a note says', () => {
    const [first] = calculations
    const odd = { ...first!, panel: '<script>x</script>', assumptions: ['<b>bold</b>'] }
    const { document } = reportPage(frozenExample({ calculations: [odd] }))
    expect(document).not.toContain('<script>x')
    expect(document).not.toContain('<b>bold')
  })
})
