import type { Decimal } from '#shared/pricing/decimal'
import { sumOf } from '#shared/pricing/decimal'

/**
 * Signed parts rounded to whole units so that they add up to `whole` on paper: each is rounded down, and the units left over go
 * one each to the largest remainders.
 *
 * Source: method of the largest remainder
 * @param whole - their sum as printed, a whole number, at most one away from the exact sum
 */
export function wholeParts(parts: readonly Decimal[], whole: Decimal): Decimal[] {
  const floors = parts.map((part) => part.floor())
  const left = whole.minus(sumOf(floors)).toNumber()
  const byRemainder = parts
    .map((part, index) => ({ index, remainder: part.minus(floors[index]!) }))
    .sort((a, b) => b.remainder.comparedTo(a.remainder) || a.index - b.index)
  const added = floors.map(() => 0)
  for (let step = 0; step < Math.abs(left); step += 1) {
    const place = left > 0 ? step % parts.length : parts.length - 1 - (step % parts.length)
    added[byRemainder[place]!.index]! += Math.sign(left)
  }
  return floors.map((floor, index) => floor.plus(added[index]!))
}
