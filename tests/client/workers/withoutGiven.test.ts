import { scheme as schemeContract } from '#shared/contracts/appraisal'
import { describe, expect, it } from 'vitest'
import { followMarks } from '../../../src/stores/followMarks'
import { toAppraisalFile } from '../../../src/stores/appraisalFile'
import { withoutRows } from '../../../src/workers/fileRows'
import { aFile } from '../../support/appraisalFileOf'
import { aSheet } from '../../support/projectSheetOf'

const bars = { bottomX: { diameter: 12, spacing: 150 }, bottomY: { diameter: 10, spacing: 200 } } as const
const solidWith = (...panels: string[]) =>
  schemeContract.parse({
    mark: 'S1',
    kind: 'solid',
    thickness: 200,
    givenPanels: panels.map((panel) => ({ level: 'L1', panel, bars })),
  })

describe('bars given to panels that are left out for now', () => {
  it('go with the panel, and those of others stay', () => {
    const file = { ...aFile(['P1', 'P2']), schemes: [solidWith('P1', 'P2', 'P9')] }
    const origin = { levels: [{ index: 0, panels: [0, 1] }], schemes: [0] }
    const { schemes } = withoutRows({ file, origin }, ['levels.0.panels.1']).file
    expect(schemes[0]!.givenPanels.map(({ panel }) => panel)).toEqual(['P1', 'P9'])
  })

  it('go with a panel that cannot be read, and are kept where there is no such panel, to be refused', () => {
    const sheet = aSheet(['P1', 'P2'])
    const [level] = sheet.levels
    const broken = { ...level!, panels: level!.panels.map((panel, i) => (i === 1 ? { ...panel, ribDirection: 999 } : panel)) }
    const stored = { ...sheet.schemes[0]!, specification: solidWith('P1', 'P2', 'P9') }
    const { file } = toAppraisalFile({ ...sheet, levels: [broken], schemes: [stored] })
    expect(file!.schemes[0]!.givenPanels.map(({ panel }) => panel)).toEqual(['P1', 'P9'])
  })
})

describe('followMarks', () => {
  const sheet = aSheet(['P1', 'P2'])
  const level = sheet.levels[0]!
  const schemes = [{ ...sheet.schemes[0]!, specification: solidWith('P1', 'P2') }]
  const renamed = (from: string, to: string) => ({
    ...level,
    panels: level.panels.map((panel) => (panel.mark === from ? { ...panel, mark: to } : panel)),
  })

  it('follows a renamed panel and a renamed level', () => {
    const [panel] = followMarks(schemes, level, renamed('P2', 'B4'))
    expect(panel!.specification.givenPanels).toMatchObject([{ panel: 'P1' }, { panel: 'B4' }])
    const [moved] = followMarks(schemes, level, { ...level, mark: 'Roof' })
    expect(moved!.specification.givenPanels).toMatchObject([{ level: 'Roof' }, { level: 'Roof' }])
  })

  it('changes nothing where nothing is renamed, given, or where panels came or went', () => {
    expect(followMarks(schemes, level, level)).toEqual([])
    expect(followMarks([sheet.schemes[0]!], level, renamed('P2', 'B4'))).toEqual([])
    expect(followMarks(schemes, level, { ...level, panels: level.panels.slice(1) })).toEqual([])
  })
})
