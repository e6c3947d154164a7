/**
 * How long a level of 40 panels takes, equal bays and mixed ones, both schemes, as a ratio to fixed arithmetic measured in the same run: a figure that can be
 * set against another machine's. Run: `npx tsx tests/bench/appraise.bench.ts`.
 */
import { appraise } from '#shared/appraise'
import { type AppraisalFileInput, appraisalFile } from '#shared/contracts/appraisal'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { mixedFile } from './mixedLevel'

const ROUNDS = 7
const COLUMNS = 8
const ROWS = 5
const SPAN_X_MM = 6600
const SPAN_Y_MM = 5400

/** A grid of equal bays, every inner edge continuous. */
function gridFile(columns: number, rows: number): AppraisalFileInput {
  const panels = Array.from({ length: columns * rows }, (_, index) => {
    const [column, row] = [index % columns, Math.floor(index / columns)]
    const [x, y] = [column * SPAN_X_MM, row * SPAN_Y_MM]
    const isContinuous = [row > 0, column < columns - 1, row < rows - 1, column > 0]
    return {
      mark: `P${index + 1}`,
      outline: [
        [x, y],
        [x + SPAN_X_MM, y],
        [x + SPAN_X_MM, y + SPAN_Y_MM],
        [x, y + SPAN_Y_MM],
      ] as [number, number][],
      edges: isContinuous.map((is) => ({
        supportWidth: 250,
        continuity: is ? ('continuous' as const) : ('discontinuous' as const),
      })),
      ribDirection: 90,
    }
  })
  return {
    format: 'bothways.appraisal/1',
    brief: { basis: 'EN1992', imposedLoad: 2, finishesLoad: 1.5, cover: 25, fireMinutes: 30, fck: 30, fyk: 500 },
    levels: [{ mark: 'L1', panels }],
    schemes: [
      {
        mark: 'R1',
        kind: 'ribbed',
        block: { length: 200, width: 400, height: 200, mass: 12.5 },
        ribWidth: 120,
        topping: 60,
        mesh: 'A142',
        solidZone: 'least',
      },
      { mark: 'S1', kind: 'solid', thickness: 'least' },
    ],
    rates: { currency: 'USD', items: { 'concrete.slab': '150', 'formwork.soffit': '20', 'blocks.whole': '2' } },
  }
}

/** Fixed work that the engine's speed is set against: sines summed and sorted. */
function baseline(): number {
  const values = Float64Array.from({ length: 1_000_000 }, (_, index) => Math.sin(index * 1.37))
  return values.sort().reduce((sum, value) => sum + value, 0)
}

function timeMs(work: () => unknown): number {
  const start = performance.now()
  work()
  return performance.now() - start
}

/** Middle of some timings, ms, after one round that is not counted. */
function medianMs(work: () => unknown): number {
  work()
  const timings = Array.from({ length: ROUNDS }, () => timeMs(work))
  return timings.sort((a, b) => a - b)[Math.floor(ROUNDS / 2)]!
}

const forty = appraisalFile.parse(gridFile(COLUMNS, ROWS))
const single = appraisalFile.parse(gridFile(1, 1))
/** Levels of differing shapes, ribbed and solid, on each basis. */
const SEED = 11
const mixed = (['EN1992', 'BS8110'] as const).map((basis) => [basis, parseAppraisalFile(mixedFile(basis, SEED))] as const)
const coldMs = timeMs(() => mixed.forEach(([, file]) => appraise(file)))
const baselineMs = medianMs(baseline)
const rows = [
  ['appraise, 40 mixed panels, both bases, before anything has run', coldMs],
  ...mixed.flatMap(([basis, file]) => [
    [`appraise, 40 mixed panels, ${basis}`, medianMs(() => appraise(file))] as const,
    ...file.schemes.map((scheme) => [`size ${scheme.kind}, ${basis}`, medianMs(() => sizeScheme(scheme, file))] as const),
  ]),
  ['appraise, 40 panels', medianMs(() => appraise(forty))],
  ['appraise, 1 panel', medianMs(() => appraise(single))],
  ['read and check, 40 panels', medianMs(() => parseAppraisalFile(gridFile(COLUMNS, ROWS)))],
] as const
console.log(`baseline ${baselineMs.toFixed(1)} ms`)
for (const [name, ms] of rows) console.log(`${name}: ${ms.toFixed(1)} ms, ${(ms / baselineMs).toFixed(3)} of the baseline`)
