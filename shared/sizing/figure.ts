/**
 * A number as it stands in a working: at most `decimals` places, trailing zeros dropped, decimal point, no grouping.
 *
 * Source: project rule, workings must be read by people and evaluated by tests
 */
export function figure(value: number, decimals = 1): string {
  return String(Number(value.toFixed(decimals)))
}

/**
 * A moment or force as a mantissa that keeps three significant digits, as `18.7e6`.
 *
 * Source: project rule, engine design section 4 (the formula with its numbers)
 */
export function scaled(value: number, power: 3 | 6): string {
  return `${figure(value / 10 ** power, value >= 10 ** (power + 2) ? 1 : 2)}e${power}`
}
