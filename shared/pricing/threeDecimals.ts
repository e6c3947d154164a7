import type { ThreePrices } from '../contracts/resource'
import { Decimal, sumOf } from './decimal'

export type PriceLevel = keyof ThreePrices

/** A low, a likely and a high amount, not rounded. */
export type ThreeDecimals = Readonly<Record<PriceLevel, Decimal>>

/** What `amountAt` gives for the low, the likely and the high price. */
export function threeDecimals(amountAt: (level: PriceLevel) => Decimal): ThreeDecimals {
  return { low: amountAt('low'), likely: amountAt('likely'), high: amountAt('high') }
}

/** Low with low, likely with likely, high with high; zero for none. */
export function sumOfThree(all: readonly ThreeDecimals[]): ThreeDecimals {
  return threeDecimals((level) => sumOf(all.map((each) => each[level])))
}

/** The three as decimal text with so many decimals, halves away from zero. */
export function printThree(amounts: ThreeDecimals, decimals: number): ThreePrices {
  const print = (level: PriceLevel) => amounts[level].toFixed(decimals)
  return { low: print('low'), likely: print('likely'), high: print('high') }
}

/** Text of three prices as numbers to reckon with. */
export function readThree(prices: ThreePrices): ThreeDecimals {
  return threeDecimals((level) => new Decimal(prices[level]))
}
