/**
 * Strength classes of concrete by their cylinder strength, MPa.
 *
 * Source: EN 1992-1-1:2004, Table 3.1
 */
const CLASSES = new Map([
  [12, 'C12/15'],
  [16, 'C16/20'],
  [20, 'C20/25'],
  [25, 'C25/30'],
  [30, 'C30/37'],
  [35, 'C35/45'],
  [40, 'C40/50'],
  [45, 'C45/55'],
  [50, 'C50/60'],
])

/** Class of a cylinder strength, or null where the table has none. */
export function concreteClass(fckMpa: number): string | null {
  return CLASSES.get(fckMpa) ?? null
}
