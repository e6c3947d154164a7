import type { BuildUp } from '../contracts/buildUp'
import type { ThreePrices } from '../contracts/resource'
import { type PricedLine, labourAmount, materialAmount, plantAmount } from './buildUpLine'
import { BuildUpLookup, type BuildUpPrices } from './buildUpPrices'
import { BuildUpRefusedError } from './buildUpRefused'
import { Decimal } from './decimal'
import { minorUnit } from './minorUnit'
import { printThree, sumOfThree, threeDecimals, type ThreeDecimals } from './threeDecimals'

/** A line of a built-up rate as it is read: amounts for one unit of the work, with two decimals more than the currency has. */
export interface BuiltUpLine extends Omit<PricedLine, 'amount'>, ThreePrices {}

/** A rate made up of resources, with the amounts that it is made of. Only `price` is rounded to the currency's minor unit. */
export interface BuiltUpRate {
  readonly lines: readonly BuiltUpLine[]
  /** Sum of the lines. */
  readonly net: ThreePrices
  /** On the net. */
  readonly overheads: ThreePrices
  /** On the net with overheads. */
  readonly profit: ThreePrices
  readonly price: ThreePrices
}

/** Decimals of the amounts on the way, beyond those of the currency. */
const WORKING_DECIMALS = 2
/** Takes off what division leaves at the fortieth digit, so that three thirds of a cent are a cent. */
const EXACT_DECIMALS = 28
/** The first rate that is too large for a book. */
const TOO_LARGE = new Decimal(1_000_000_000)

/**
 * The rate of one unit of the work that a build-up makes: materials, labour and plant; overheads on these, profit on all of it; low with
 * low prices, likely with likely, high with high. Rounded once, at the end, half away from zero.
 *
 * Source: project rule after common practice of estimating, no source
 * @param prices - at least the resources and gangs that it names, by code
 * @param currency - three capital letters
 * @throws BuildUpRefusedError when it names what is not there or is of another kind, or when the rate is too large for a book
 */
export function builtUpRate(buildUp: BuildUp, prices: BuildUpPrices, currency: string): BuiltUpRate {
  const lookup = new BuildUpLookup(prices)
  const lines = [
    ...buildUp.materials.map((line, index) => materialAmount(line, lookup, `materials.${index}`)),
    ...buildUp.labour.map((line, index) => labourAmount(line, lookup, `labour.${index}`)),
    ...buildUp.plant.map((line, index) => plantAmount(line, lookup, `plant.${index}`)),
  ].filter((line) => line !== null)
  if (lookup.issues.length > 0) throw new BuildUpRefusedError(lookup.issues)
  const net = sumOfThree(lines.map(({ amount }) => amount))
  const overheads = share(net, buildUp.overheadsPercent)
  const profit = share(sumOfThree([net, overheads]), buildUp.profitPercent)
  const gross = sumOfThree([net, overheads, profit])
  if (gross.high.gte(TOO_LARGE)) {
    throw new BuildUpRefusedError([{ path: '', message: 'expected a rate below 1,000,000,000' }])
  }
  const decimals = minorUnit(currency) + WORKING_DECIMALS
  return {
    lines: lines.map(({ amount, ...line }) => ({ ...line, ...printThree(amount, decimals) })),
    net: printThree(net, decimals),
    overheads: printThree(overheads, decimals),
    profit: printThree(profit, decimals),
    price: printThree(
      threeDecimals((level) => gross[level].toDecimalPlaces(EXACT_DECIMALS)),
      minorUnit(currency),
    ),
  }
}

const share = (of: ThreeDecimals, percent: string): ThreeDecimals => threeDecimals((level) => of[level].times(percent).div(100))
