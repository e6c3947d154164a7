import type { ItemCode, SchemeResult } from '#shared/contracts/appraisal'
import type { StoredLevel } from '#shared/contracts/project'
import { itemInWords } from '../quantity/itemInWords'

/** What one floor of a level makes of one item, unrounded. */
export interface LevelMade {
  readonly item: ItemCode
  readonly words: string
  readonly value: number
  readonly unit: string
}

/** Quantities of one floor of a level: the level's parts of each item, less its timesing; items that it does not make are left out. */
export function levelMakes(level: Pick<StoredLevel, 'mark' | 'repeat'>, result: SchemeResult): LevelMade[] {
  return result.quantities.flatMap(({ item, unit, parts }) => {
    const value = parts.filter((part) => part.level === level.mark).reduce((sum, part) => sum + part.value, 0) / level.repeat
    if (value === 0) return []
    const words = item === 'concrete.slab' ? `${itemInWords(item)}, ${result.depth} overall` : itemInWords(item)
    return [{ item, unit, value, words }]
  })
}

/** Digits after the point that a unit is printed with. Source: project rule, engine design, rounding of quantities */
export function decimalsOf(unit: string): number {
  if (unit === 'nr') return 0
  return unit === 't' ? 3 : 2
}
