import type { ConcreteSplit } from '#shared/contracts/appraisalResult'

export interface SplitPart {
  readonly name: string
  /** m³ */
  readonly value: number
  readonly share: number
  /** Share of what stands before it. */
  readonly start: number
}

const NAMES: Record<keyof ConcreteSplit, string> = {
  topping: 'topping',
  ribs: 'ribs',
  edgeStrips: 'edge strips',
  solidZones: 'solid zones',
  crossRibs: 'cross ribs',
  trimmers: 'trimmers round voids',
  fillers: 'fillers at the ends of rows',
  slab: 'slab',
  wallStrips: 'strips over walls',
}

/** Parts of the concrete that are there, in the order of the split, with their shares of the whole. */
export function splitParts(split: ConcreteSplit): SplitPart[] {
  const keys = (Object.keys(NAMES) as (keyof ConcreteSplit)[]).filter((key) => split[key] > 0)
  const whole = keys.reduce((sum, key) => sum + split[key], 0)
  let before = 0
  return keys.map((key) => {
    const part = { name: NAMES[key], value: split[key], share: split[key] / whole, start: before / whole }
    before += split[key]
    return part
  })
}
