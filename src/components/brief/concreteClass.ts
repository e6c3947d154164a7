/**
 * Strength classes of concrete: cylinder and cube strength, MPa.
 *
 * Source: EN 1992-1-1:2004, Table 3.1
 */
const CLASSES = [
  [12, 15],
  [16, 20],
  [20, 25],
  [25, 30],
  [30, 37],
  [35, 45],
  [40, 50],
  [45, 55],
  [50, 60],
] as const

const nameOf = (found: (typeof CLASSES)[number] | undefined) => (found ? `C${found[0]}/${found[1]}` : null)

/** Class of a cylinder strength, or null where the table has none. */
export function concreteClass(fckMpa: number): string | null {
  return nameOf(CLASSES.find(([cylinder]) => cylinder === fckMpa))
}

/** Class of a cube strength, or null where the table has none. */
export function cubeClass(fcuMpa: number): string | null {
  return nameOf(CLASSES.find(([, cube]) => cube === fcuMpa))
}

/** Cube strength of the class of a cylinder strength; between classes that of the next weaker one, MPa. */
export function cubeStrengthOf(fckMpa: number): number {
  return (CLASSES.findLast(([cylinder]) => cylinder <= fckMpa) ?? CLASSES[0])[1]
}

/** Cylinder strength of the class of a cube strength; between classes that of the next weaker one, MPa. */
export function cylinderStrengthOf(fcuMpa: number): number {
  return (CLASSES.findLast(([, cube]) => cube <= fcuMpa) ?? CLASSES[0])[0]
}
