import type { AppraisalFile } from '#shared/contracts/appraisal'
import { appraisalFile } from '#shared/contracts/appraisal'

/** One level with a square panel of 6 m for each mark, one ribbed and one solid scheme. */
export function aFile(marks: readonly string[]): AppraisalFile {
  return appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief: { basis: 'EN1992', imposedLoad: 2, finishesLoad: 1.2, cover: 25, fireMinutes: 60, fck: 25, fyk: 500 },
    levels: [
      {
        mark: 'L1',
        panels: marks.map((mark, at) => ({
          mark,
          outline: [
            [at * 6000, 0],
            [(at + 1) * 6000, 0],
            [(at + 1) * 6000, 6000],
            [at * 6000, 6000],
          ],
          edges: [{ supportWidth: 250, continuity: 'continuous' }],
          ribDirection: 90,
        })),
      },
    ],
    schemes: [
      {
        mark: 'R1',
        kind: 'ribbed',
        block: { length: 200, width: 400, height: 200, mass: 9.6 },
        ribWidth: 120,
        topping: 50,
        solidZone: 300,
      },
      { mark: 'S1', kind: 'solid', thickness: 'least' },
    ],
  })
}
