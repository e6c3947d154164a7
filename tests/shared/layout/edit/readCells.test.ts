import { describe, expect, it } from 'vitest'
import { isManyCells, pastedRows } from '../../../../shared/layout/edit/pastedRows'
import { EMPTY_ROW } from '../../../../shared/layout/edit/panelRowText'
import { likelyLength, readLength } from '../../../../shared/layout/edit/readLength'
import { readPanelRow } from '../../../../shared/layout/edit/readPanelRow'
import { readRibDirection, ribDirectionText } from '../../../../shared/layout/edit/readRibDirection'
import { readVoid, voidText } from '../../../../shared/layout/edit/readVoid'
import { rectangleRing } from '../../../../shared/layout/edit/rectangle'

describe('readLength', () => {
  it.each([
    ['6600', 6600],
    [' 6,600 ', 6600],
    ['6 600', 6600],
    ['12\u00a0600.5', 12_600.5],
  ])('reads %j', (text, value) => {
    expect(readLength(text, 'along x')).toEqual({ value })
  })

  it.each([
    ['', /missing/],
    ['abc', /no number/],
    ['NaN', /no number/],
    ['1e9', /no number/],
    ['66,00', /no number/],
    ['0', /more than 0/],
    ['-5', /more than 0/],
    ['1000001', /at most/],
  ])('refuses %j and says what was expected', (text, reason) => {
    expect(readLength(text, 'along x')).toMatchObject({ reason: expect.stringMatching(reason) })
  })

  it('asks about metres', () => {
    expect(readLength('6,6', 'along x')).toMatchObject({ repair: 'Was it 6,600?' })
    expect(readLength('5.4 m', 'along x')).not.toHaveProperty('value')
  })

  it('suggests what an unusual length was meant to be', () => {
    expect([540, 6.6, 54_000, 6600].map(likelyLength)).toEqual([5400, 6600, 5400, null])
  })
})

describe('readRibDirection', () => {
  it('reads x, y and degrees, and writes them so', () => {
    expect(['x', 'Y', '37.5°', '0'].map(readRibDirection)).toEqual([{ value: 0 }, { value: 90 }, { value: 37.5 }, { value: 0 }])
    expect([0, 90, 37.5].map(ribDirectionText)).toEqual(['x', 'y', '37.5°'])
  })

  it('names the same direction for one beyond half a turn', () => {
    expect(readRibDirection('200')).toMatchObject({ repair: 'The same direction is 20°.' })
    expect(readRibDirection('north')).not.toHaveProperty('value')
  })
})

describe('readVoid', () => {
  const box = { minX: 1000, minY: 0, maxX: 7600, maxY: 5400 }

  it('puts a void in the middle, at its offsets, or at the corner it had', () => {
    expect(readVoid('2600×3600', box, null)).toEqual({ voids: [rectangleRing([3000, 900], 2600, 3600)] })
    expect(readVoid('2600 x 3600 at 2000 / 0', box, null)).toEqual({ voids: [rectangleRing([3000, 0], 2600, 3600)] })
    expect(readVoid('1,000 × 900', box, rectangleRing([1500, 700], 10, 10))).toEqual({
      voids: [rectangleRing([1500, 700], 1000, 900)],
    })
    expect(readVoid('none', box, null)).toEqual({ voids: [] })
  })

  it('refuses what is no size', () => {
    expect(readVoid('stair', box, null)).toMatchObject({ reason: expect.stringContaining('expected its size') })
    expect(readVoid('2600 × wide', box, null)).toMatchObject({ reason: expect.stringContaining('void along y') })
  })

  it('writes what it reads', () => {
    expect(voidText([rectangleRing([3000, 900], 2600, 3600)])).toBe('2600×3600')
    expect(voidText([])).toBe('')
    expect(voidText([rectangleRing([0, 0], 1, 1), rectangleRing([5, 5], 1, 1)])).toBe('2 voids')
  })
})

describe('readPanelRow', () => {
  it('reads a row, ribs along the shorter side and once unless typed', () => {
    expect(readPanelRow({ ...EMPTY_ROW, mark: 'P1', alongX: '6,600', alongY: '5400' }, [])).toEqual({
      row: { mark: 'P1', alongX: 6600, alongY: 5400, ribDirection: 90, repeat: 1 },
    })
  })

  it('names every wrong cell', () => {
    const read = readPanelRow({ mark: 'P1', alongX: 'six', alongY: '', ribs: 'z', void: '', times: '1000000000' }, ['P1'])
    expect('problems' in read && read.problems.map(({ column }) => column)).toEqual(['mark', 'alongX', 'alongY', 'ribs', 'times'])
  })
})

describe('pastedRows', () => {
  it('reads lines of tab-separated cells, leaving a line of heads out', () => {
    expect(pastedRows('Mark\tx\ty\r\nP1\t6,600\t6000\tx\t2\r\nP2\t4500\t6000\r\n')).toEqual({
      heading: 'Mark x y',
      rows: [
        { mark: 'P1', alongX: '6,600', alongY: '6000', ribs: 'x', times: '2', void: '' },
        { mark: 'P2', alongX: '4500', alongY: '6000', ribs: '', times: '', void: '' },
      ],
    })
  })

  it('keeps quoted cells, skips blank lines, and lets cells too many show as wrong', () => {
    const { rows } = pastedRows('"P ""1"""\t6000\t5000\n\nP2\t1\t2\tx\t1\tmore')
    expect(rows.map(({ mark, times }) => [mark, times])).toEqual([
      ['P "1"', ''],
      ['P2', '1 more'],
    ])
  })

  it('takes one cell with a line end for one cell', () => {
    expect(['6600', '6600\r\n', 'a\tb', 'a\nb'].map(isManyCells)).toEqual([false, false, true, true])
  })
})
