import type { FullAppraisal } from '#shared/appraise'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import type { AppraisalFile } from '#shared/contracts/appraisal'
import { describe, expect, it } from 'vitest'
import { appraiseWhatStands } from '../../../src/workers/appraiseWhatStands'
import { aFile } from '../../support/appraisalFileOf'

const origin = { levels: [{ index: 1, panels: [0, 2, 3] }], schemes: [0, 1] }
const empty: FullAppraisal = {
  appraisal: { format: 'bothways.appraisal-result/1', schemes: [], comparison: null },
  sized: [],
  alsoCompared: [],
  scopeDifferences: [],
  problems: [],
}
const marksOf = (file: AppraisalFile) => file.levels.flatMap(({ panels }) => panels.map(({ mark }) => mark))

describe('appraiseWhatStands', () => {
  it('leaves a refused panel out and names it as the sheet counts', () => {
    const tried: string[][] = []
    const answer = appraiseWhatStands(
      (file) => {
        tried.push(marksOf(file))
        const bad = marksOf(file).indexOf('P3')
        if (bad >= 0) throw new AppraisalRefusedError([{ path: `levels.0.panels.${bad}.outline`, message: 'crosses itself' }])
        return empty
      },
      { file: aFile(['P1', 'P3', 'P4']), origin },
    )
    expect(tried).toEqual([
      ['P1', 'P3', 'P4'],
      ['P1', 'P4'],
    ])
    expect(answer).toMatchObject({ full: empty, problems: [{ path: 'levels.1.panels.2.outline', message: 'crosses itself' }] })
    expect(marksOf(answer.file!)).toEqual(['P1', 'P4'])
  })

  it('leaves a panel that one scheme cannot cover out of all of them', () => {
    const tried: string[][] = []
    const answer = appraiseWhatStands(
      (file) => {
        tried.push(marksOf(file))
        const bad = marksOf(file).indexOf('P4')
        const problems = bad < 0 ? [] : [{ scheme: 'R1', issue: { path: `levels.0.panels.${bad}.edges`, message: 'free edge' } }]
        return { ...empty, problems }
      },
      { file: aFile(['P1', 'P3', 'P4']), origin },
    )
    expect(tried.at(-1)).toEqual(['P1', 'P3'])
    expect(answer.problems).toEqual([{ path: 'levels.1.panels.3.edges', message: 'free edge' }])
  })

  it('keeps the other schemes when one lies outside its rules', () => {
    const full = { ...empty, problems: [{ scheme: 'R1', issue: { path: 'schemes.0.topping', message: 'too thin' } }] }
    const answer = appraiseWhatStands(() => full, { file: aFile(['P1', 'P3', 'P4']), origin })
    expect(answer).toMatchObject({ full, problems: [{ path: 'schemes.0.topping', message: 'too thin' }] })
  })

  it('answers nothing when the brief is refused, or no panel is left', () => {
    const refuse = (path: string) => () => {
      throw new AppraisalRefusedError([{ path, message: 'no' }])
    }
    const given = { file: aFile(['P1', 'P3', 'P4']), origin }
    expect(appraiseWhatStands(refuse('brief.cover'), given)).toEqual({
      full: null,
      file: null,
      problems: [{ path: 'brief.cover', message: 'no' }],
    })
    expect(appraiseWhatStands(refuse('levels.0.panels.0'), given).full).toBeNull()
  })

  it('throws on what is a fault of the engine', () => {
    const fault = () => {
      throw new TypeError('not a function')
    }
    expect(() => appraiseWhatStands(fault, { file: aFile(['P1', 'P3', 'P4']), origin })).toThrow(TypeError)
  })
})
