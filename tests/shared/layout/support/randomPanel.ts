import fc from 'fast-check'
import type { Panel, RibbedScheme } from '#shared/contracts/appraisal'
import { checkPanel } from '#shared/layout/checks/checkPanel'
import { panelOf, rectangle, ribbedScheme } from './floorParts'

/** Numbers that meet no whole millimetre or thousandth but at 0: exact fits are tried on purpose, not by chance. */
const uneven = (min: number, max: number) =>
  fc.integer({ min: Math.ceil(min * 1009), max: Math.floor(max * 1009) }).map((part) => part / 1009)
type Outline = [number, number][]

const rectangles = fc.tuple(uneven(2500, 9000), uneven(2500, 9000)).map(([x, y]) => rectangle(0, 0, x, y))

const wholeRectangles = fc
  .tuple(fc.integer({ min: 5, max: 18 }), fc.integer({ min: 5, max: 18 }))
  .map(([x, y]) => rectangle(0, 0, x * 500, y * 500))

const rectanglesWithJointOnSide = fc
  .tuple(uneven(4000, 9000), uneven(2500, 9000), uneven(0.2, 0.8))
  .map(([x, y, share]): Outline => [[0, 0], [x * share, 0], ...rectangle(0, 0, x, y).slice(1)])

const lShapes = fc
  .tuple(uneven(5000, 10_000), uneven(5000, 10_000), uneven(0.3, 0.7), uneven(0.3, 0.7))
  .map(([x, y, shareX, shareY]): Outline => [
    [0, 0],
    [x, 0],
    [x, y * shareY],
    [x * shareX, y * shareY],
    [x * shareX, y],
    [0, y],
  ])

const skewQuads = fc
  .tuple(uneven(3000, 9000), uneven(3000, 9000), uneven(-1500, 1500), uneven(-1500, 1500), uneven(-1000, 1000))
  .map(([x, y, a, b, c]): Outline => [
    [0, 0],
    [x, c],
    [x + a, y + b],
    [a, y - c],
  ])

const triangles = fc.tuple(uneven(4000, 9000), uneven(0, 8000), uneven(3000, 8000)).map(([x, apexX, y]): Outline => [
  [0, 0],
  [x, 0],
  [apexX, y],
])

const stars = fc
  .array(uneven(2200, 5500), { minLength: 5, maxLength: 11 })
  .map((radii): Outline =>
    radii.map((radius, i) => {
      const angle = (2 * Math.PI * i) / radii.length + 0.05
      return [radius * Math.cos(angle), radius * Math.sin(angle)]
    }),
  )
  .filter((outline) => outline.every((_, i) => turnSine(outline, i) > Math.sin((6 * Math.PI) / 180)))

/** Sine of the turn at a corner, whichever way it goes. */
function turnSine(ring: Outline, i: number): number {
  const [a, b, c] = [ring[i]!, ring[(i + 1) % ring.length]!, ring[(i + 2) % ring.length]!]
  const cross = (b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0])
  return Math.abs(cross) / Math.hypot(b[0] - a[0], b[1] - a[1]) / Math.hypot(c[0] - b[0], c[1] - b[1])
}

const edgeRecords = (count: number) =>
  fc.array(
    fc.oneof(
      {
        weight: 4,
        arbitrary: fc.record({ supportWidth: uneven(0, 400), continuity: fc.constantFrom('continuous', 'discontinuous') }),
      },
      { weight: 1, arbitrary: fc.constant({ supportWidth: 0, continuity: 'free' }) },
    ),
    { minLength: count, maxLength: count },
  )

/** A convex void of 3 to 6 corners, or an L-shaped one, somewhere around the origin's far side. */
const voids = fc.array(
  fc
    .record({
      at: fc.tuple(uneven(-4000, 8000), uneven(-4000, 8000)),
      size: uneven(150, 1200),
      turn: fc.oneof(fc.constant(0), uneven(0, 360)),
      corners: fc.integer({ min: 2, max: 6 }),
    })
    .map(({ at: [x, y], size, turn, corners }): Outline => {
      const angles = Array.from({ length: corners }, (_, i) => ((turn + (360 * i) / corners) * Math.PI) / 180)
      if (corners > 2) return angles.map((angle) => [x + size * Math.cos(angle), y + size * Math.sin(angle)])
      const [cosine, sine] = [Math.cos(angles[0]!), Math.sin(angles[0]!)]
      const l: Outline = [
        [0, 0],
        [size, 0],
        [size, size / 3],
        [size / 3, size / 3],
        [size / 3, size],
        [0, size],
      ]
      return l.map(([u, v]) => [x + u * cosine - v * sine, y + u * sine + v * cosine])
    }),
  { maxLength: 4 },
)

/** Panels of every shape with sound geometry: rectangles, L shapes, skew quadrilaterals, triangles, stars; voids that do not fit are left out. */
export const randomPanel: fc.Arbitrary<Panel> = fc
  .oneof(rectangles, wholeRectangles, rectanglesWithJointOnSide, lShapes, skewQuads, triangles, stars)
  .chain((outline) =>
    fc.record({
      outline: fc.constant(outline),
      edges: fc.oneof(edgeRecords(1), edgeRecords(outline.length)),
      ribDirection: fc.oneof(fc.constantFrom(0, 45, 90), uneven(0, 179.9)),
      voids,
    }),
  )
  .map(({ voids: offered, ...given }) => {
    const fitting = offered.reduce<Outline[]>((kept, ring) => {
      const trial = [...kept, ring]
      return checkPanel(panelOf({ ...given, voids: trial }), 'panel').length === 0 ? trial : kept
    }, [])
    return panelOf({ ...given, voids: fitting })
  })
  .filter((panel) => checkPanel(panel, 'panel').length === 0)

/** Ribbed schemes of every kind of block, rib, strip and cross rib. */
export const randomScheme: fc.Arbitrary<RibbedScheme> = fc
  .record({
    block: fc.record({
      length: fc.constantFrom(200, 250, 333.3),
      width: fc.constantFrom(380, 400, 520),
      height: fc.constant(200),
      mass: fc.constant(15),
    }),
    ribWidth: fc.constantFrom(100, 120, 150),
    edgeStrip: fc.constantFrom(0, 100, 215.5),
    solidZone: fc.oneof(fc.constantFrom(0, 300), uneven(0, 900)),
    crossRibs: fc.oneof(
      fc.constantFrom('none', 'rule'),
      fc.record({ every: uneven(500, 3000), width: fc.constantFrom(50, 100, 150) }),
    ),
    trimmerWidth: fc.constantFrom(0, 100, 180),
    cutBlocks: fc.boolean(),
    leastPiece: fc.constantFrom(30, 50, 90),
  })
  .map((given) => ribbedScheme(given))
