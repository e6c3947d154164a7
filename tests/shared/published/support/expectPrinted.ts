import { expect } from 'vitest'

/** Tolerances of the case sheet, relative to the printed value. */
export const HALF_PERCENT = 0.005
export const ONE_PERCENT = 0.01
export const TWO_PERCENT = 0.02
export const TWO_AND_A_HALF_PERCENT = 0.025

/** A value against the one that is printed. */
export function expectPrinted(actual: number, printed: number, relative: number): void {
  expect(Math.abs(actual - printed), `${actual} against ${printed} as printed`).toBeLessThanOrEqual(relative * printed)
}

/** A value against a printed one that is rounded to some decimals. */
export function expectRounded(actual: number, printed: number, decimals: number): void {
  const half = 0.5 * 10 ** -decimals
  expect(Math.abs(actual - printed), `${actual} against ${printed} as printed`).toBeLessThanOrEqual(half + 1e-9)
}
