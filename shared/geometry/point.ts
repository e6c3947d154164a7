/** A point of the plane, mm. */
export type Point = readonly [x: number, y: number]
