import type { ItemCode, Unit } from '../contracts/appraisal'

/** What is measured how: data, so that another method of measurement is another object and no other code. */
export interface MeasurementRules {
  readonly name: string
  readonly source: string
  /** Decimals that a quantity of each unit is printed and priced with. */
  readonly decimals: Readonly<Record<Unit, number>>
  /** A void is deducted where it is larger than this. */
  readonly deductVoidsOver: {
    /** Volume of the void through the floor, m³: slab concrete. */
    readonly concreteM3: number
    /** Area on plan, m²: soffit formwork and propping. */
    readonly soffitM2: number
    /** Area on plan, m²: mesh. */
    readonly meshM2: number
    /** Area on plan, m²: curing. */
    readonly curingM2: number
  }
  /** Rules in words, by item or family of items (`steel.bar`), as the reader of a quantity sees them. */
  readonly notes: Readonly<Record<string, string>>
}

/**
 * The rules in force: net quantities, full deck, laps of mesh in the rate. Every void comes off the concrete, however small,
 * so that a thin and a thick floor deduct the same voids (NRM2 leaves voids up to 0.05 m³ in).
 *
 * Source: RICS New Rules of Measurement 2 (2012), work section 11, from memory; decimals and voids in concrete: project rule
 */
export const netRules: MeasurementRules = {
  name: 'Net quantities after NRM2 section 11',
  source: 'RICS New Rules of Measurement 2 (2012), work section 11, from memory; decimals and voids in concrete: project rule',
  decimals: { 'm³': 2, 'm²': 2, m: 2, t: 3, nr: 0 },
  deductVoidsOver: { concreteM3: 0, soffitM2: 5, meshM2: 0, curingM2: 0 },
  notes: {
    'concrete.slab': 'Net; reinforcement not deducted; voids and blocks deducted. Strips over walls in, over beams not.',
    'blocks.whole': 'Whole blocks as laid; breakage is in the rate.',
    'blocks.cut': 'Cut blocks as laid; breakage is in the rate.',
    'blocks.closedEnds': 'Two for each run of blocks, closed before concreting.',
    'steel.bar': 'By diameter, nominal mass; laps and hooks in; rolling margin, tying wire and chairs in the rate.',
    'steel.mesh': 'Net area of the floor; laps in the rate.',
    'formwork.soffit': 'Full deck between supports; voids up to 5 m² not deducted.',
    'formwork.edge': 'Free edges of the level and edges of voids, by length.',
    'curing.area': 'Upper surface of the floor.',
    'propping.area': 'As soffit formwork.',
  },
}

/** Unit of each item: rates are per unit of it. */
export function unitOf(item: ItemCode): Unit {
  if (item === 'concrete.slab') return 'm³'
  if (item.startsWith('blocks.')) return 'nr'
  if (item.startsWith('steel.bar.')) return 't'
  return item === 'formwork.edge' ? 'm' : 'm²'
}

/**
 * How an item is measured, in words; of the rules that fit (`steel.bar`, `steel.bar.12`) the narrowest.
 *
 * @throws RangeError when the rules say nothing of the item
 */
export function ruleOf(item: ItemCode, { name, notes }: MeasurementRules): string {
  const families = Object.keys(notes).filter((family) => item === family || item.startsWith(`${family}.`))
  const narrowest = families.sort((a, b) => b.length - a.length)[0]
  if (narrowest === undefined) throw new RangeError(`expected a rule for ${item} in ${name}`)
  return notes[narrowest]!
}
