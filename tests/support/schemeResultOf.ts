import type { Check, Cost, SchemeResult } from '#shared/contracts/appraisalResult'

/** A priced and passing scheme of one concrete line, with what a test changes. */
export function aResult(kind: 'ribbed' | 'solid', given: Partial<SchemeResult> = {}): SchemeResult {
  return {
    mark: kind === 'ribbed' ? 'R1' : 'S1',
    kind,
    depth: 250,
    passes: true,
    checks: [],
    panels: [],
    quantities: [],
    deadLoad: { perArea: 4, total: 4000 },
    cost: aCost('1000.00'),
    ...given,
  }
}

/** A cost of this total, all of it concrete, without markups. */
export function aCost(total: string, given: Partial<Cost> = {}): Cost {
  return {
    currency: 'USD',
    lines: [{ item: 'concrete.slab', quantity: '10.00', unit: 'm³', rate: '100', amount: total }],
    markups: [],
    unpriced: [],
    total,
    perArea: '10.00',
    ...given,
  }
}

export function aCheck(given: Partial<Check> = {}): Check {
  return {
    level: 'L1',
    panel: 'P1',
    name: 'shear',
    clause: '6.2.2(1)',
    demand: 10,
    capacity: 20,
    unit: 'kN',
    utilisation: 0.5,
    pass: true,
    working: 'V = 10 kN',
    ...given,
  }
}
