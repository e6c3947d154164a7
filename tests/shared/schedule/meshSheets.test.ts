import { describe, expect, it } from 'vitest'
import { meshSheets } from '#shared/schedule/meshSheets'
import { handSized, levelOf, rectangle, ribbedOf } from '../support/handSized'

const laid = (level: ReturnType<typeof levelOf>, basis: 'EN1992' | 'BS8110' = 'EN1992', mesh: 'A142' | 'A393' = 'A142') =>
  meshSheets(handSized(ribbedOf({ mesh }), [level]), mesh, [level], basis)

describe('sheets of 4.8 by 2.4 m', () => {
  it('cover a panel row by row with their laps', () => {
    // clear 6350 across the ribs, 5750 along. Lap of A142: max(150, one pitch of 200). Along the ribs: rows (6350 − 200)/2200 → 3, in each
    // (5750 − 200)/4600 → 2: 6 sheets, of which two are whole. Across: (5750 − 200)/2200 → 3, (6350 − 200)/4600 → 2: 6 as well.
    const sheets = laid({ ...levelOf({ outline: rectangle(0, 0, 6600, 6000), repeat: 2 }), repeat: 3 })
    expect(sheets.lapMm).toBe(200)
    expect(sheets.panels).toEqual([
      // 2400 + 2400 + 1950 across, 4800 + 1150 along
      { level: 'L1', panel: 'P1', members: 6, whole: 2, cut: 4, isAlongRibs: true, laidM2: expect.closeTo(6.75 * 5.95, 9) },
    ])
    expect([sheets.whole, sheets.cut]).toEqual([12, 24])
    expect(sheets.laidM2).toBeCloseTo(6 * 6.75 * 5.95, 9)
    expect(sheets.laidKg).toBeCloseTo(6 * 6.75 * 5.95 * 2.22, 9)
    expect(sheets.orderedKg).toBeCloseTo(36 * 11.52 * 2.22, 9)
  })

  it('take one sheet where one covers the panel exactly', () => {
    const sheets = laid(levelOf({ outline: rectangle(0, 0, 2650, 5050) }))
    expect(sheets.panels[0]).toMatchObject({ whole: 1, cut: 0, isAlongRibs: true })
  })

  it('lie across the ribs where that takes fewer', () => {
    // 4800 across the ribs and 2400 along: two half sheets along, one across
    const sheets = laid(levelOf({ outline: rectangle(0, 0, 5050, 2650) }))
    expect(sheets.panels[0]).toMatchObject({ whole: 1, cut: 0, isAlongRibs: false })
  })

  it('lap by the wire and by the code', () => {
    const level = levelOf({ outline: rectangle(0, 0, 6600, 6000) })
    expect(laid(level, 'EN1992', 'A393').lapMm).toBe(400)
    expect(laid(level, 'BS8110').lapMm).toBe(250)
  })

  it('follow a slanted edge row by row', () => {
    const sheets = laid(
      levelOf({
        outline: [
          [0, 0],
          [9000, 0],
          [3000, 6000],
          [0, 6000],
        ],
        ribDirection: 0,
      }),
    )
    const box = laid(levelOf({ outline: rectangle(0, 0, 9000, 6000), ribDirection: 0 }))
    expect(sheets.laidM2).toBeLessThan(box.laidM2)
    expect(sheets.whole + sheets.cut).toBeLessThan(box.whole + box.cut)
  })
})
