import { Decimal } from '#shared/pricing/decimal'
import { steelMassKg } from '#shared/takeoff/steelMass'
import { decimalText, figureText, signedDecimalText, signedText } from '../figureText'
import type { FrozenComparison, FrozenScheme } from '../frozenComparison'
import { wholeTotal, type SchemeKind } from './headline'

/** A row of the main table, as text. `better`: which scheme has less of it, as printed; null where neither, or where less is not better. */
export interface ComparedFigure {
  readonly label: string
  readonly unit: string
  readonly ribbed: string
  readonly solid: string
  /** Ribbed less solid, signed. */
  readonly difference: string
  readonly better: SchemeKind | null
}

function less(ribbed: number, solid: number): SchemeKind | null {
  return ribbed === solid ? null : ribbed < solid ? 'ribbed' : 'solid'
}

function measured(label: string, unit: string, ribbed: number, solid: number, decimals: number): ComparedFigure {
  const [first, second] = [Number(ribbed.toFixed(decimals)), Number(solid.toFixed(decimals))]
  return {
    label,
    unit,
    ribbed: figureText(first, decimals),
    solid: figureText(second, decimals),
    difference: signedText(first - second, decimals),
    better: less(first, second),
  }
}

function priced(label: string, unit: string, ribbed: Decimal, solid: Decimal, decimals: number): ComparedFigure {
  return {
    label,
    unit,
    ribbed: decimalText(ribbed.toFixed(decimals)),
    solid: decimalText(solid.toFixed(decimals)),
    difference: signedDecimalText(ribbed.minus(solid).toFixed(decimals)),
    better: less(ribbed.comparedTo(solid), 0),
  }
}

function sumOfItems({ quantities }: FrozenScheme, family: string): number {
  return quantities.filter(({ item }) => item.startsWith(family)).reduce((sum, { net }) => sum + net, 0)
}

function steelT({ quantities }: FrozenScheme): number {
  return steelMassKg(quantities.map((quantity) => ({ ...quantity, parts: [] }))) / 1000
}

function blocksOf(scheme: FrozenScheme): number {
  return sumOfItems(scheme, 'blocks.whole') + sumOfItems(scheme, 'blocks.cut')
}

function blockFigure({ ribbed, solid }: FrozenComparison): ComparedFigure {
  const counted = measured('Blocks', 'nr', blocksOf(ribbed), blocksOf(solid), 0)
  return { ...counted, solid: 'none', difference: '', better: null }
}

/** What each scheme costs, weighs and takes, in the order a reader asks. */
export function comparedFigures(frozen: FrozenComparison): ComparedFigure[] {
  const { ribbed, solid, edition } = frozen
  const perArea = ({ perArea: amount }: FrozenScheme) => new Decimal(amount)
  const decimals = Math.max(perArea(ribbed).decimalPlaces(), perArea(solid).decimalPlaces())
  return [
    priced('Cost of all floors', edition.currency, wholeTotal(frozen, 'ribbed'), wholeTotal(frozen, 'solid'), 0),
    priced('Cost', `${edition.currency}/m²`, perArea(ribbed), perArea(solid), decimals),
    measured('Dead load', 'kN/m²', ribbed.deadLoad.perArea, solid.deadLoad.perArea, 2),
    measured('Dead load in all', 'kN', ribbed.deadLoad.total, solid.deadLoad.total, 0),
    measured('Concrete', 'm³', sumOfItems(ribbed, 'concrete.'), sumOfItems(solid, 'concrete.'), 1),
    measured('Steel, mesh in', 't', steelT(ribbed), steelT(solid), 2),
    blockFigure(frozen),
    measured('Overall depth', 'mm', ribbed.depth, solid.depth, 0),
  ]
}
