import type { SchemeResult } from '#shared/contracts/appraisalResult'
import { mesh } from '#shared/contracts/appraisal'
import { FABRIC } from '#shared/sizing/tables/fabric'
import { itemisedQuantities } from '#shared/takeoff/itemisedQuantities'
import type { Pair } from './phrase'

/** One column of what each scheme makes; money as its exact decimal string, measures as numbers. */
export interface ComparedFigure {
  readonly key: string
  readonly name: string
  readonly unit: string
  readonly decimals: number
  readonly values: Pair<number | null>
  /** Less is better; false: neither is better, as with a count of blocks. */
  readonly hasBetter: boolean
}

/** Who is better and by how much. `share` is ribbed against solid, −0.18 is 18 % less; null where solid has none. */
export interface FigureVerdict {
  readonly better: 'ribbed' | 'solid' | 'same' | 'neither'
  readonly difference: number | null
  readonly share: number | null
}

const netOf = (scheme: SchemeResult, matches: (item: string) => boolean): number =>
  itemisedQuantities(scheme.quantities)
    .filter(({ item }) => matches(item))
    .reduce((sum, { net }) => sum + net, 0)

/** Bars and mesh together, t. */
export function steelTonnes(scheme: SchemeResult): number {
  const bars = netOf(scheme, (item) => item.startsWith('steel.bar.'))
  const meshes = mesh.options.map(
    (name) => (netOf(scheme, (item) => item === `steel.mesh.${name}`) * FABRIC[name].massKgPerM2) / 1000,
  )
  return meshes.reduce((sum, mass) => sum + mass, bars)
}

const money = (amount: string | undefined): number | null => (amount === undefined ? null : Number(amount))

/** The figures that are compared, in the order they are read; those of money only where both are priced. */
export function comparedFigures({ ribbed, solid }: Pair<SchemeResult>): ComparedFigure[] {
  const each = (read: (scheme: SchemeResult) => number | null): Pair<number | null> => ({
    ribbed: read(ribbed),
    solid: read(solid),
  })
  const currency = ribbed.cost?.currency ?? solid.cost?.currency
  const priced: ComparedFigure[] =
    currency === undefined
      ? []
      : [
          {
            key: 'total',
            name: 'Cost of floors',
            unit: currency,
            decimals: 0,
            values: each(({ cost }) => money(cost?.total)),
            hasBetter: true,
          },
          {
            key: 'perArea',
            name: 'Cost',
            unit: `${currency}/m²`,
            decimals: 2,
            values: each(({ cost }) => money(cost?.perArea)),
            hasBetter: true,
          },
        ]
  const blocks = (scheme: SchemeResult) => netOf(scheme, (item) => item === 'blocks.whole' || item === 'blocks.cut')
  const measured = [
    ['deadLoad', 'Dead load', 'kN/m²', 2, (scheme: SchemeResult) => scheme.deadLoad.perArea],
    ['frame', 'On the frame', 'kN', 0, (scheme: SchemeResult) => scheme.deadLoad.total],
    ['concrete', 'Concrete', 'm³', 1, (scheme: SchemeResult) => netOf(scheme, (item) => item === 'concrete.slab')],
    ['steel', 'Steel, mesh in', 't', 2, steelTonnes],
    ['blocks', 'Blocks', 'nr', 0, blocks],
    ['depth', 'Overall depth', 'mm', 0, (scheme: SchemeResult) => scheme.depth],
  ] as const
  return [
    ...priced,
    ...measured.map(([key, name, unit, decimals, read]) => ({
      key,
      name,
      unit,
      decimals,
      values: each(read),
      hasBetter: key !== 'blocks',
    })),
  ]
}

/** Verdict on a figure as printed: figures that print the same are the same. */
export function verdictOf({ values, decimals, hasBetter }: ComparedFigure): FigureVerdict {
  const { ribbed, solid } = values
  if (ribbed === null || solid === null) return { better: 'neither', difference: null, share: null }
  const printed = (value: number) => Number(value.toFixed(decimals))
  const difference = printed(printed(ribbed) - printed(solid))
  const share = solid === 0 ? null : ribbed / solid - 1
  if (!hasBetter) return { better: 'neither', difference, share }
  return { better: difference === 0 ? 'same' : difference < 0 ? 'ribbed' : 'solid', difference, share }
}
