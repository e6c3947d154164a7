import fc from 'fast-check'
import type { XY } from './samplingOracle'

/** Shares of two lengths, never round ones, so that no point lies on an edge. */
const share = fc.nat(99_999).map((part) => (part + 0.417) / 100_000)

/** Shares for `count` points. */
export const pointShares = (count: number) => fc.array(fc.tuple(share, share), { minLength: count, maxLength: count })

/** Points spread over the upright rectangle around a ring. */
export function spreadPoints(ring: readonly XY[], shares: readonly (readonly [number, number])[]): XY[] {
  const [xs, ys] = [ring.map(([x]) => x), ring.map(([, y]) => y)]
  const [left, bottom] = [Math.min(...xs), Math.min(...ys)]
  return shares.map(([u, v]): XY => [left + u * (Math.max(...xs) - left), bottom + v * (Math.max(...ys) - bottom)])
}
