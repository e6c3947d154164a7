import type { Brief } from '../contracts/appraisal'
import type { EuropeanValues } from '../contracts/nationalValues'
import { figure } from './figure'

/** Symbols of the nationally chosen values of EN 1990 and EN 1992-1-1. */
const SYMBOLS: Readonly<Record<keyof EuropeanValues, string>> = {
  gammaPermanent: 'γG',
  gammaVariable: 'γQ',
  gammaConcrete: 'γC',
  gammaSteel: 'γS',
  alphaCc: 'αcc',
  redistributionK1: 'k1 of 5.5(4)',
  redistributionK2: 'k2 of 5.5(4)',
  vMinCoefficient: 'coefficient of vmin',
  greatestSteelFactor: 'greatest steel factor of 7.4.2(2)',
  greatestSpanDepth: 'greatest span to depth over K',
}

/**
 * Which national values a brief is sized with, as the rest of a sentence after the code's name.
 *
 * Source: project rule, what was chosen is said (engine design section 4)
 */
export function nationalValuesText(brief: Brief): string {
  if (brief.basis === 'BS8110') return `γm ${brief.nationalValues.gammaSteel ?? 1.05} for reinforcement`
  const { nationalValues } = brief
  const chosen = (Object.keys(SYMBOLS) as (keyof EuropeanValues)[]).flatMap((key) => {
    const value = nationalValues[key]
    return value === undefined ? [] : [`${SYMBOLS[key]} = ${figure(value, 4)}`]
  })
  if (chosen.length === 0) return 'the recommended national values, except αcc = 0.85'
  const rest =
    nationalValues.alphaCc === undefined ? 'the other values recommended, except αcc = 0.85' : 'the other values recommended'
  return `${chosen.join(', ')}; ${rest}`
}
