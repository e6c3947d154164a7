import type { RibbedScheme, SolidScheme } from '../../contracts/appraisal'
import { figure } from '../figure'
import type { CureInput, Lever, Trial } from './cure'

/**
 * Steps and ends of sizes that are tried, mm.
 *
 * Source: project rule (the firm's step of thickness, common steps of ribs and toppings); ends as the contract, or as common practice allows
 */
const TRIED = {
  thickness: { step: 5, most: 1500 },
  topping: { step: 5, most: 300 },
  ribWidth: { step: 5, most: 600 },
  solidZone: { step: 10, most: 5000 },
  cover: { step: 5, least: 10, most: 100 },
} as const

/**
 * Concrete strengths that are tried, MPa: characteristic strength of cylinders, and of cubes.
 *
 * Source: EN 1992-1-1:2004, Table 3.1 (seen); BS 8110-1:1997, grades in steps of 5 (common practice)
 */
const STRENGTHS = { EN1992: [12, 16, 20, 25, 30, 35, 40, 45, 50], BS8110: [20, 25, 30, 35, 40, 45, 50, 55, 60] } as const

const none: Lever = { trials: [], isEvery: false, limit: '' }

function upwards(from: number, step: number, most: number): number[] {
  const first = (Math.floor(from / step) + 1) * step
  return Array.from({ length: Math.max(0, Math.floor((most - first) / step) + 1) }, (_, i) => first + i * step)
}

function lever(
  name: string,
  unit: string,
  from: number,
  values: readonly number[],
  at: (value: number) => Omit<Trial, 'change'>,
): Lever {
  const end = values.at(-1)
  if (end === undefined) return none
  const trials = values.map((value) => ({
    ...at(value),
    change: `${name} ${figure(value)} ${unit} instead of ${figure(from)} ${unit}`,
  }))
  return { trials, isEvery: false, limit: `${name} ${end > from ? 'up' : 'down'} to ${figure(end)} ${unit}` }
}

/**
 * A given thickness made greater; nothing where the engine finds it.
 *
 * Source: project rule, failing checks say what would cure them
 */
export function thickerSlab({ brief }: CureInput, scheme: SolidScheme): Lever {
  const { thickness } = scheme
  if (thickness === 'least') return none
  const { step, most } = TRIED.thickness
  return lever('thickness', 'mm', thickness, upwards(thickness, step, most), (value) => ({
    brief,
    scheme: { ...scheme, thickness: value },
  }))
}

type RibSize = 'topping' | 'ribWidth'
const RIB_SIZE_NAMES = { topping: 'topping', ribWidth: 'rib' } as const

/**
 * A thicker topping, or wider ribs.
 *
 * Source: project rule, failing checks say what would cure them
 */
export function largerRib({ brief }: CureInput, scheme: RibbedScheme, size: RibSize): Lever {
  const { step, most } = TRIED[size]
  const from = scheme[size]
  return lever(RIB_SIZE_NAMES[size], 'mm', from, upwards(from, step, most), (value) => ({
    brief,
    scheme: { ...scheme, [size]: value },
  }))
}

/**
 * A wider solid zone where it is given; where the engine widens it, it has done so already.
 *
 * Source: project rule, failing checks say what would cure them
 */
export function widerZone({ brief }: CureInput, scheme: RibbedScheme): Lever {
  const { solidZone } = scheme
  if (solidZone === 'least') return none
  const { step, most } = TRIED.solidZone
  return lever('solid zone', 'mm', solidZone, upwards(solidZone, step, most), (value) => ({
    brief,
    scheme: { ...scheme, solidZone: value },
  }))
}

/**
 * More cover for the bars, or less.
 *
 * Source: project rule, failing checks say what would cure them
 */
export function otherCover({ brief, scheme }: CureInput, isMore: boolean): Lever {
  const { step, least, most } = TRIED.cover
  const { cover } = brief
  const more = upwards(cover, step, most)
  const less = upwards(least - step, step, cover - 1).reverse()
  return lever('cover', 'mm', cover, isMore ? more : less, (value) => ({ scheme, brief: { ...brief, cover: value } }))
}

/**
 * Stronger concrete, class by class.
 *
 * Source: project rule, failing checks say what would cure them
 */
export function strongerConcrete({ brief, scheme }: CureInput): Lever {
  if (brief.basis === 'EN1992') {
    const values = STRENGTHS.EN1992.filter((fck) => fck > brief.fck)
    return lever('concrete fck', 'MPa', brief.fck, values, (fck) => ({ scheme, brief: { ...brief, fck } }))
  }
  const values = STRENGTHS.BS8110.filter((fcu) => fcu > brief.fcu)
  return lever('concrete fcu', 'MPa', brief.fcu, values, (fcu) => ({ scheme, brief: { ...brief, fcu } }))
}
