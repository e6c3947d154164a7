import { interpolate } from './interpolate'

const RATIOS = [1, 1.1, 1.2, 1.3, 1.4, 1.5, 1.75, 2]
const SHORT = [0.062, 0.074, 0.084, 0.093, 0.099, 0.104, 0.113, 0.118]
const LONG = [0.062, 0.061, 0.059, 0.055, 0.051, 0.046, 0.037, 0.029]

/**
 * Moment coefficients of a two-way panel on four sides whose corners may lift: m = α·n·lx², both directions.
 *
 * Source: BS 8110-1:1997, Table 3.13 (seen in several independent public encodings)
 * @param aspect - ly/lx, 1 to 2, interpolated between the printed columns
 */
export function simplySupportedCoefficients(aspect: number): { readonly short: number; readonly long: number } {
  return { short: interpolate(RATIOS, SHORT, aspect), long: interpolate(RATIOS, LONG, aspect) }
}
