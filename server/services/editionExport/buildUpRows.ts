import type { BuildUp } from '#shared/contracts/buildUp'
import { labourAmount, materialAmount, plantAmount, type PricedLine } from '#shared/pricing/buildUpLine'
import { BuildUpLookup, type BuildUpPrices } from '#shared/pricing/buildUpPrices'
import { Decimal } from '#shared/pricing/decimal'
import { minorUnit } from '#shared/pricing/minorUnit'
import { sumOfThree, threeDecimals, type PriceLevel, type ThreeDecimals } from '#shared/pricing/threeDecimals'
import type { RowsByCode } from './gangSheet'
import { cached, LEVEL_COLUMNS, LEVELS } from './levels'
import { empty, formula, number, text, type SheetCell } from './sheetCell'

/** What the rows of a build-up refer to. */
export interface Referred {
  readonly prices: BuildUpPrices
  readonly resourceRows: RowsByCode
  readonly gangRows: RowsByCode
  readonly currency: string
}

/** A line with its inputs in columns E to K and its formula at each level, in the row `at`. */
interface Line {
  readonly part: string
  readonly priced: PricedLine | null
  readonly inputs: readonly SheetCell[]
  readonly at: (row: number, level: PriceLevel) => string
  readonly source: string
}

const column = LEVEL_COLUMNS.buildUps
const NOTHING = Array<SheetCell>(7).fill(empty)

function linesOf({ materials, labour, plant }: BuildUp, { prices, resourceRows, gangRows }: Referred): Line[] {
  const lookup = new BuildUpLookup(prices)
  const resource = (code: string, level: PriceLevel) =>
    `resources!${LEVEL_COLUMNS.resources[level]}${resourceRows.get(code) ?? 0}`
  return [
    ...materials.map((line): Line => ({
      part: 'material',
      priced: materialAmount(line, lookup, ''),
      inputs: [number(line.quantity), number(line.wastePercent), number(String(line.uses)), empty, empty, empty, empty],
      at: (row, level) => `${resource(line.resource, level)}*E${row}*(1+F${row}/100)/G${row}`,
      source: line.source,
    })),
    ...labour.map((line): Line => ({
      part: 'labour',
      priced: labourAmount(line, lookup, ''),
      inputs: [
        empty,
        empty,
        empty,
        ...(line.basis === 'hours' ? [number(line.value), empty] : [empty, number(line.value)]),
        empty,
        empty,
      ],
      at: (row, level) =>
        `gangs!${LEVEL_COLUMNS.gangs[level]}${gangRows.get(line.gang) ?? 0}${line.basis === 'hours' ? `*H${row}` : `/I${row}`}`,
      source: line.source,
    })),
    ...plant.map((line): Line => {
      const { fuel } = line
      return {
        part: 'plant',
        priced: plantAmount(line, lookup, ''),
        inputs: [
          ...[empty, empty, empty, empty, number(line.outputPerHour)],
          ...(fuel === null ? [empty, empty] : [text(fuel.resource), number(fuel.perHour)]),
        ],
        at: (row, level) =>
          fuel === null
            ? `${resource(line.resource, level)}/I${row}`
            : `(${resource(line.resource, level)}+${resource(fuel.resource, level)}*K${row})/I${row}`,
        source: line.source,
      }
    }),
  ]
}

const amounts = (at: (level: PriceLevel) => string, values: ThreeDecimals): SheetCell[] =>
  LEVELS.map((level) => formula(at(level), cached(values[level])))

/** Net, overheads, profit and the rate, below the lines. */
function additionRows(item: string, buildUp: BuildUp, first: number, net: ThreeDecimals, currency: string): SheetCell[][] {
  const row = first + linesCount(buildUp)
  const share = (of: ThreeDecimals, percent: string) => threeDecimals((level) => of[level].times(percent).div(100))
  const overheads = share(net, buildUp.overheadsPercent)
  const profit = share(sumOfThree([net, overheads]), buildUp.profitPercent)
  const rate = threeDecimals((level) =>
    sumOfThree([net, overheads, profit])[level].toDecimalPlaces(28).toDecimalPlaces(minorUnit(currency)),
  )
  const add = (part: string, percent: string | null, at: (level: PriceLevel) => string, values: ThreeDecimals): SheetCell[] => [
    ...[text(item), text(part), empty, empty],
    ...(percent === null ? NOTHING : [empty, number(percent), ...NOTHING.slice(2)]),
    ...amounts(at, values),
    empty,
  ]
  return [
    add('net', null, (level) => `SUM(${column[level]}${first}:${column[level]}${row - 1})`, net),
    add('overheads', buildUp.overheadsPercent, (level) => `${column[level]}${row}*F${row + 1}/100`, overheads),
    add(
      'profit',
      buildUp.profitPercent,
      (level) => `(${column[level]}${row}+${column[level]}${row + 1})*F${row + 2}/100`,
      profit,
    ),
    add('rate', null, (level) => `ROUND(SUM(${column[level]}${row}:${column[level]}${row + 2}),${minorUnit(currency)})`, rate),
  ]
}

const linesCount = ({ materials, labour, plant }: BuildUp): number => materials.length + labour.length + plant.length

/**
 * Rows of one build-up with working formulas; the last is the rate, rounded as ours.
 * @param first - row of the sheet, counted from 1, that its first line gets
 */
export function buildUpRows(item: string, buildUp: BuildUp, referred: Referred, first: number): SheetCell[][] {
  const lines = linesOf(buildUp, referred)
  const zero = threeDecimals(() => new Decimal(0))
  const rows = lines.map(({ part, priced, inputs, at, source }, index) => [
    ...[text(item), text(part), text(priced?.code ?? ''), text(priced?.name ?? '')],
    ...inputs,
    ...amounts((level) => at(first + index, level), priced?.amount ?? zero),
    text(source),
  ])
  const net = sumOfThree(lines.map(({ priced }) => priced?.amount ?? zero))
  return [...rows, ...additionRows(item, buildUp, first, net, referred.currency)]
}
