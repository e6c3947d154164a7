import { describe, expect, it } from 'vitest'
import { isTighter, tightestPanel } from '../../../shared/calculation/tightestPanel'
import type { Check } from '../../../shared/contracts/appraisalResult'

const check = (panel: string, utilisation: number, pass = utilisation <= 1): Check => ({
  level: 'L1',
  panel,
  name: 'shear',
  clause: '6.2.2',
  demand: utilisation,
  capacity: 1,
  unit: 'kN',
  utilisation,
  pass,
  working: '',
})

describe('the tightest panel', () => {
  it('is where most of what there is is used, the first of equal ones', () => {
    expect(tightestPanel([check('P1', 0.7), check('P2', 0.9), check('P3', 0.9)])).toEqual({ level: 'L1', panel: 'P2' })
  })

  it('is one that fails before any that passes', () => {
    expect(tightestPanel([check('P1', 0.99), check('P2', 0.5, false)]).panel).toBe('P2')
    expect(isTighter(check('P1', 0.99), check('P2', 0.5, false))).toBe(false)
  })

  it('is asked of a scheme that has checks', () => {
    expect(() => tightestPanel([])).toThrow(RangeError)
  })
})
