import type { ItemCode } from '#shared/contracts/appraisal'
import type { SchemeResult } from '#shared/contracts/appraisalResult'
import type { StoredLevel } from '#shared/contracts/project'
import { itemisedQuantities } from '#shared/takeoff/itemisedQuantities'
import { itemInWords } from '../quantity/itemInWords'

/** What one floor of a level makes of one item, unrounded. */
export interface LevelMade {
  readonly item: ItemCode
  readonly words: string
  readonly value: number
  readonly unit: string
}

/**
 * Quantities of one floor of a level: the level's parts of each item, less its timesing; bars of all diameters as one; items
 * that the level does not make are left out.
 */
export function levelMakes(level: Pick<StoredLevel, 'mark' | 'repeat'>, result: SchemeResult): LevelMade[] {
  const made = itemisedQuantities(result.quantities).flatMap(({ item, unit, parts }) => {
    const value = parts.filter((part) => part.level === level.mark).reduce((sum, part) => sum + part.value, 0) / level.repeat
    if (value === 0) return []
    const words = item === 'concrete.slab' ? `${itemInWords(item)}, ${result.depth} overall` : itemInWords(item)
    return [{ item, unit, value, words }]
  })
  const bars = made.filter(isBar)
  const [first] = bars
  if (first === undefined) return made
  const sizes = [...new Set([first, bars.at(-1)!].map(({ item }) => item.split('.')[2]))].join(' to ')
  const all = { ...first, words: `Bars, ${sizes} mm`, value: bars.reduce((sum, { value }) => sum + value, 0) }
  return made.flatMap((row) => (row === first ? [all] : isBar(row) ? [] : [row]))
}

function isBar({ item }: Pick<LevelMade, 'item'>): boolean {
  return item.startsWith('steel.bar.')
}

/** Digits after the point that a unit is printed with. Source: project rule, engine design, rounding of quantities */
export function decimalsOf(unit: string): number {
  if (unit === 'nr') return 0
  return unit === 't' ? 3 : 2
}
