import type { ItemCode, Scheme } from '../contracts/appraisal'
import type { Unit } from '../contracts/appraisalResult'
import type { CompositeItem, Measurement, Stage } from '../contracts/measurement'

/** How a rule is known: seen in a text, from memory, a rule of this project, or common practice without a source. */
export type RuleSource = 'seen' | 'memory' | 'project' | 'practice'

/** A rule in words, as the reader of a quantity sees it. */
export interface RuleNote {
  readonly text: string
  readonly source: RuleSource
}

/** Bounds of the stages of a description, mm, ascending; above the last in equal stages, or in one without an end. */
export interface Stages {
  readonly boundsMm: readonly number[]
  readonly thenEveryMm?: number
}

/** One item for a square metre of floor and what it is made up of: items, or families of them (`steel.mesh`). */
export interface Composite {
  readonly item: CompositeItem
  readonly of: readonly string[]
}

/** How far sheets of mesh lie over one another: by the basis that sizes the floor, on sheets of this size. */
export interface MeshLaps {
  readonly lap: 'basis'
  readonly sheetLengthMm: number
  readonly sheetWidthMm: number
}

/** What is measured how: data, so that another method of measurement is another object and no other code. */
export interface MeasurementRules {
  readonly code: Measurement
  readonly name: string
  /** What sets them apart, in few words, for a list of rule sets. */
  readonly apart: string
  readonly source: string
  /** Decimals that a quantity of each unit is printed and priced with. */
  readonly decimals: Readonly<Record<Unit, number>>
  /** Whether a quantity that would be printed as nothing stands as one unit. */
  readonly isOneAtLeast: boolean
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
    /** Area on plan, m²: composite items. */
    readonly floorM2: number
  }
  readonly barUnit: 't' | 'kg'
  /** Null: mesh is net, laps are in the rate. */
  readonly meshLaps: MeshLaps | null
  /** Stages that items are billed apart by. */
  readonly stages: Readonly<Partial<Record<ItemCode, Readonly<Partial<Record<Stage['of'], Stages>>>>>>
  /** Edges up to this depth are measured by length, deeper ones by area; null: all by length. */
  readonly edgesByLengthUpToMm: number | null
  readonly composites: Readonly<Partial<Record<Scheme['kind'], Composite>>>
  /** By item or family of items (`steel.bar`). */
  readonly notes: Readonly<Record<string, RuleNote>>
}

/** Unit that the rate of an item is per, whatever rules it is billed by. */
export function unitOf(item: ItemCode | CompositeItem): Unit {
  if (item === 'concrete.slab') return 'm³'
  if (item.startsWith('blocks.')) return 'nr'
  if (item.startsWith('steel.bar.')) return 't'
  return item === 'formwork.edge' ? 'm' : 'm²'
}

/** Unit that an item is billed in. */
export function billedUnitOf(item: ItemCode | CompositeItem, { barUnit }: Pick<MeasurementRules, 'barUnit'>): Unit {
  return item.startsWith('steel.bar.') ? barUnit : unitOf(item)
}

/**
 * How an item is measured; of the rules that fit (`steel.bar`, `steel.bar.12`) the narrowest.
 *
 * @throws RangeError when the rules say nothing of the item
 */
export function ruleOf(item: ItemCode | CompositeItem, { name, notes }: MeasurementRules): RuleNote {
  const families = Object.keys(notes).filter((family) => item === family || item.startsWith(`${family}.`))
  const narrowest = families.sort((a, b) => b.length - a.length)[0]
  if (narrowest === undefined) throw new RangeError(`expected a rule for ${item} in ${name}`)
  return notes[narrowest]!
}
