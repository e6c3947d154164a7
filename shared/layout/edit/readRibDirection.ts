import type { ReadNumber } from './readLength'

/** Direction of ribs along x and along y, degrees from x. */
const NAMED: Readonly<Record<string, number>> = { x: 0, y: 90 }

/**
 * Degrees from x, 0 ≤ d < 180, of what was typed: `x`, `y`, or a number with or without °.
 */
export function readRibDirection(text: string): ReadNumber {
  const typed = text.trim().toLowerCase().replace(/°$/, '').trim()
  const named = NAMED[typed]
  if (named !== undefined) return { value: named }
  const reason = 'ribs run: expected x, y or degrees from x, as 37.5'
  if (!/^-?\d+(\.\d+)?$/.test(typed)) return { reason }
  const value = Number(typed)
  if (value >= 0 && value < 180) return { value }
  const turned = ((value % 180) + 180) % 180
  return { reason: `${reason}, from 0 to under 180`, repair: `The same direction is ${ribDirectionText(turned)}.` }
}

/** How a rib direction stands in a cell: x, y, or degrees. */
export function ribDirectionText(degrees: number): string {
  const name = Object.keys(NAMED).find((key) => NAMED[key] === degrees)
  return name ?? `${Number(degrees.toFixed(3))}°`
}
