import { describe, expect, it } from 'vitest'
import { toAppraisalFile } from '../../../src/stores/appraisalFile'
import { aSheet } from '../../support/projectSheetOf'

describe('toAppraisalFile', () => {
  it('carries brief, levels, schemes, likely rates and markups', () => {
    const { file, problems } = toAppraisalFile(aSheet())
    expect(problems).toEqual([])
    expect(file?.levels[0]?.panels.map(({ mark }) => mark)).toEqual(['P1', 'P2'])
    expect(file?.schemes.map(({ mark }) => mark)).toEqual(['R1', 'S1'])
    expect(file?.rates?.items).toEqual({ 'concrete.slab': '149.63' })
    expect(file?.rates?.markups.preliminariesPercent).toBe('10')
  })

  it('has no rates where no edition is chosen, or the reader may not see them', () => {
    expect(toAppraisalFile({ ...aSheet(), edition: null }).file?.rates).toBeUndefined()
  })

  it('leaves out a panel that the contract refuses and names its field as the sheet counts', () => {
    const sheet = aSheet(['P1', 'P2', 'P3'])
    sheet.levels[0]!.panels[1]!.ribDirection = 400
    const { file, origin, problems } = toAppraisalFile(sheet)
    expect(file?.levels[0]?.panels.map(({ mark }) => mark)).toEqual(['P1', 'P3'])
    expect(origin.levels).toEqual([{ index: 0, panels: [0, 2] }])
    expect(problems.map(({ path }) => path)).toEqual(['levels.0.panels.1.ribDirection'])
  })

  it('leaves out a level without panels and makes no file of nothing', () => {
    const sheet = aSheet()
    const bare = { ...sheet.levels[0]!, panels: [] }
    const both = toAppraisalFile({ ...sheet, levels: [bare, sheet.levels[0]!] })
    expect(both.origin.levels).toEqual([{ index: 1, panels: [0, 1] }])
    expect(toAppraisalFile({ ...sheet, levels: [bare] }).file).toBeNull()
    expect(toAppraisalFile({ ...sheet, schemes: [] }).file).toBeNull()
  })

  it('makes no file of a brief that the contract refuses', () => {
    const sheet = aSheet()
    sheet.project.brief.cover = 5
    const { file, problems } = toAppraisalFile(sheet)
    expect(file).toBeNull()
    expect(problems.map(({ path }) => path)).toEqual(['brief.cover'])
  })
})
