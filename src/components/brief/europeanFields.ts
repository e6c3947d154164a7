import type { EuropeanValues } from '#shared/contracts/nationalValues'

/** A nationally chosen value as the brief asks for it; `given` is what holds where a country chooses nothing else. */
export interface EuropeanField {
  readonly key: Exclude<keyof EuropeanValues, 'greatestSpanDepth'>
  readonly label: string
  readonly given: number
  readonly least: number
  readonly most: number
  readonly hint: string
}

/**
 * The values of EN 1990 and EN 1992-1-1 that a national annex may choose, with the recommended ones.
 *
 * Source: EN 1990:2002, Table A1.2(B); EN 1992-1-1:2004, 2.4.2.4, 3.1.6, 5.5(4), 6.2.2(1), 7.4.2(2); ranges by the contract
 */
export const EUROPEAN_FIELDS: readonly EuropeanField[] = [
  { key: 'gammaPermanent', label: 'γG, permanent loads', given: 1.35, least: 1, most: 1.5, hint: 'EN 1990, 6.10: 1.35.' },
  { key: 'gammaVariable', label: 'γQ, variable loads', given: 1.5, least: 1, most: 1.8, hint: 'EN 1990, 6.10: 1.5.' },
  { key: 'gammaConcrete', label: 'γC, concrete', given: 1.5, least: 1.2, most: 1.8, hint: '2.4.2.4: 1.5.' },
  { key: 'gammaSteel', label: 'γS, reinforcement', given: 1.15, least: 1, most: 1.3, hint: '2.4.2.4: 1.15.' },
  { key: 'alphaCc', label: 'αcc, concrete in bending', given: 0.85, least: 0.7, most: 1, hint: '3.1.6: 1.0; 0.85 here.' },
  {
    key: 'redistributionK1',
    label: 'k1, neutral axis after redistribution',
    given: 0.44,
    least: 0.3,
    most: 0.7,
    hint: '5.5(4), x/d ≤ (δ − k1)/k2: 0.44.',
  },
  {
    key: 'redistributionK2',
    label: 'k2, neutral axis after redistribution',
    given: 1.25,
    least: 0.6,
    most: 1.5,
    hint: '5.5(4): 1.25.',
  },
  { key: 'vMinCoefficient', label: 'Coefficient of vmin', given: 0.035, least: 0, most: 0.06, hint: '6.2.2(1): 0.035.' },
  {
    key: 'greatestSteelFactor',
    label: 'Most that more steel raises span to depth',
    given: 1.5,
    least: 1,
    most: 2,
    hint: '7.4.2(2), 500·As,prov/(fyk·As,req): 1.5.',
  },
]

/** Cap of span to depth, times K, where an annex has one. */
export const SPAN_DEPTH_CAP = { given: 35, least: 15, most: 80 } as const

/** Values with one of them set, or left to what is given. */
export function withChosen(values: EuropeanValues, key: keyof EuropeanValues, value: number | undefined): EuropeanValues {
  const given = EUROPEAN_FIELDS.find((field) => field.key === key)?.given
  const rest = Object.fromEntries(Object.entries(values).filter(([each]) => each !== key))
  return value === undefined || value === given ? rest : { ...rest, [key]: value }
}
