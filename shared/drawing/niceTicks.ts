/**
 * Round values (1, 2, 2.5 or 5 times a power of ten apart) that cover a range and hold zero.
 * @param most - how many steps at most, > 0
 * @returns ascending, at least two
 */
export function niceTicks(least: number, greatest: number, most: number): number[] {
  const low = Math.min(0, least)
  const high = Math.max(0, greatest)
  const rough = (high - low || 1) / most
  const power = 10 ** Math.floor(Math.log10(rough))
  const step = ([1, 2, 2.5, 5].find((factor) => factor * power >= rough * (1 - 1e-9)) ?? 10) * power
  const first = Math.floor(low / step + 1e-9)
  const last = Math.max(first + 1, Math.ceil(high / step - 1e-9))
  return Array.from({ length: last - first + 1 }, (_, index) => Number(((first + index) * step).toPrecision(12)))
}
