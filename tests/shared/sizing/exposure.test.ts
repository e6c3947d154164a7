import { describe, expect, it } from 'vitest'
import { appraise } from '#shared/appraise'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { appraisalFile, type AppraisalFileInput } from '#shared/contracts/appraisal'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'
import { exposureCover as british } from '#shared/sizing/bs8110/exposure'
import { exposureCover as european } from '#shared/sizing/en1992/exposure'
import { loads, ribbed, row, solid } from './support/floors'

type BriefInput = AppraisalFileInput['brief']

const EN: Extract<BriefInput, { basis: 'EN1992' }> = { basis: 'EN1992', ...loads, fck: 30, fyk: 500 }
const BS: Extract<BriefInput, { basis: 'BS8110' }> = { basis: 'BS8110', ...loads, fcu: 35, fy: 460 }

const fileWith = (brief: BriefInput): AppraisalFileInput => ({
  format: 'bothways.appraisal/1',
  brief,
  levels: [{ mark: 'L1', panels: row([5000, 4200], 5200) }],
  schemes: [ribbed, solid],
})

const rowsFor = (brief: BriefInput) =>
  appraise(appraisalFile.parse(fileWith(brief))).schemes.map(({ checks }) =>
    checks.filter(({ name }) => name === 'cover.exposure'),
  )

describe('cover for exposure', () => {
  it.each([EN, BS])('is not checked where the brief names no exposure: $basis', (brief) => {
    expect(rowsFor(brief)).toEqual([[], []])
  })

  it.each([
    ['XC1', 25],
    ['XC3', 35],
    ['XC4', 40],
    ['XS3', 55],
  ] as const)('EN 1992-1-1 Table 4.4N, S4, %s: nominal cover %i mm with 10 mm for deviation', (exposure, cover) => {
    const bars = { coverMm: 25, linkMm: 0, diameterMm: 12 }
    expect(european(exposure, bars)).toMatchObject([{ demand: cover, capacity: 25, clause: 'EN 1992-1-1 4.4.1' }])
  })

  it('EN 1992-1-1: bond of a thick bar asks its diameter, less the link outside it', () => {
    expect(european('XC1', { coverMm: 30, linkMm: 0, diameterMm: 25 })).toMatchObject([{ demand: 35 }])
    expect(european('XC1', { coverMm: 30, linkMm: 8, diameterMm: 25 })).toMatchObject([{ demand: 27 }])
  })

  it.each([
    ['mild', 30, 25],
    ['mild', 35, 20],
    ['moderate', 35, 35],
    ['moderate', 42, 30],
    ['severe', 40, 40],
    ['verySevere', 50, 30],
    ['mostSevere', 50, 50],
  ] as const)('BS 8110-1 Table 3.3, %s, grade %i: %i mm', (exposure, fcu, cover) => {
    expect(british(exposure, { coverMm: 20, linkMm: 0, diameterMm: 12 }, fcu)).toMatchObject([{ demand: cover, unit: 'mm' }])
  })

  it('BS 8110-1: a grade the table has no cover for fails by the grade it asks', () => {
    const bars = { coverMm: 60, linkMm: 0, diameterMm: 12 }
    expect(british('moderate', bars, 30)).toMatchObject([{ demand: 35, capacity: 30, unit: 'MPa' }])
    expect(british('mild', bars, 25)).toMatchObject([{ demand: 30, capacity: 25, unit: 'MPa' }])
  })

  it('stands once in every panel of both kinds, and fails where the cover is less', () => {
    const good = rowsFor({ ...EN, exposure: 'XC1' })
    const bad = rowsFor({ ...EN, exposure: 'XC4' })
    for (const rows of [...good, ...bad]) expect(rows).toHaveLength(2)
    expect(good.flat().every(({ pass }) => pass)).toBe(true)
    expect(bad.flat().some(({ pass }) => pass)).toBe(false)
    expect(bad.flat()[0]!.working).toContain('XC4')
  })

  it('refuses a class of the other code', () => {
    const mixed = { ...fileWith(EN), brief: { ...EN, exposure: 'mild' } }
    expect(() => parseAppraisalFile(mixed)).toThrow(AppraisalRefusedError)
  })
})
