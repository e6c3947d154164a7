import { type Brief, brief as briefContract } from '#shared/contracts/appraisal'
import { cubeStrengthOf, cylinderStrengthOf } from './concreteClass'

export type Basis = Brief['basis']

/** Names of the codes of practice, as a reader knows them. */
export const BASIS_NAMES: Readonly<Record<Basis, string>> = {
  EN1992: 'EN 1992-1-1:2004',
  BS8110: 'BS 8110-1:1997',
}

/** Characteristic strengths, MPa, and what they are called in a basis. */
export interface BasisStrengths {
  readonly concreteMpa: number
  readonly steelMpa: number
}

/** Ranges of the strengths that each basis takes, MPa, as the contract has them. */
export const STRENGTH_RANGES = {
  EN1992: { concrete: [12, 50], steel: [250, 600] },
  BS8110: { concrete: [20, 60], steel: [250, 500] },
} as const

export const STRENGTH_NAMES: Readonly<Record<Basis, { readonly concrete: string; readonly steel: string }>> = {
  EN1992: { concrete: 'Concrete, cylinder strength fck', steel: 'Reinforcement, yield strength fyk' },
  BS8110: { concrete: 'Concrete, cube strength fcu', steel: 'Reinforcement, yield strength fy' },
}

/** Strengths of a brief. */
export function strengthsOf(brief: Brief): BasisStrengths {
  return brief.basis === 'EN1992'
    ? { concreteMpa: brief.fck, steelMpa: brief.fyk }
    : { concreteMpa: brief.fcu, steelMpa: brief.fy }
}

/** What to propose where a brief goes over to another basis: the same class of concrete and the same steel, as far as that basis takes them. */
export function proposedStrengths(brief: Brief, basis: Basis): BasisStrengths {
  if (brief.basis === basis) return strengthsOf(brief)
  const { concrete, steel } = STRENGTH_RANGES[basis]
  const { concreteMpa, steelMpa } = strengthsOf(brief)
  const same = basis === 'BS8110' ? cubeStrengthOf(concreteMpa) : cylinderStrengthOf(concreteMpa)
  const within = (value: number, [least, most]: readonly [number, number]) => Math.min(most, Math.max(least, value))
  return { concreteMpa: within(same, concrete), steelMpa: within(steelMpa, steel) }
}

/** What belongs to one basis and means nothing in the other. */
const OWN = ['basis', 'fck', 'fyk', 'fcu', 'fy', 'nationalValues', 'exposure']

/** What of a brief is left behind where it goes over to another basis: words for the reader, empty where there is nothing. */
export function leftBehind(brief: Brief): string[] {
  return [
    ...(Object.keys(brief.nationalValues).length > 0 ? ['nationally chosen values'] : []),
    ...(brief.exposure === undefined ? [] : ['the exposure class']),
  ]
}

/** The brief sized by a basis with these strengths: all that both bases know stays as it is. */
export function withBasis(brief: Brief, basis: Basis, { concreteMpa, steelMpa }: BasisStrengths): Brief {
  const kept = Object.fromEntries(Object.entries(brief).filter(([key]) => !OWN.includes(key)))
  const strengths = basis === 'EN1992' ? { fck: concreteMpa, fyk: steelMpa } : { fcu: concreteMpa, fy: steelMpa }
  return briefContract.parse({ ...kept, basis, ...strengths })
}
