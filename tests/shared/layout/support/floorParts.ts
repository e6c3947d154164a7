import type { AppraisalFile, Level, Panel, RibbedScheme } from '#shared/contracts/appraisal'
import { appraisalFile, level, panel, ribbed } from '#shared/contracts/appraisal'

/** Ribbed scheme of 200 × 400 × 200 blocks, 100 mm ribs, 50 mm topping and 300 mm solid zones, unless given otherwise. */
export function ribbedScheme(given: object = {}): RibbedScheme {
  const block = { length: 200, width: 400, height: 200, mass: 15 }
  return ribbed.parse({ mark: 'R1', kind: 'ribbed', block, ribWidth: 100, topping: 50, solidZone: 300, ...given })
}

/** Anticlockwise rectangle from its lower left corner. */
export function rectangle(x: number, y: number, lengthX: number, lengthY: number): [number, number][] {
  return [
    [x, y],
    [x + lengthX, y],
    [x + lengthX, y + lengthY],
    [x, y + lengthY],
  ]
}

/** Panel of 6.0 × 4.5 m between 300 mm beams, ribs along x, unless given otherwise. */
export function panelOf(given: object = {}): Panel {
  const edges = [{ supportWidth: 300, continuity: 'discontinuous' }]
  return panel.parse({ mark: 'P1', outline: rectangle(0, 0, 6000, 4500), edges, ribDirection: 0, ...given })
}

export function levelOf(panels: readonly Panel[], given: object = {}): Level {
  return level.parse({ mark: 'L1', panels, ...given })
}

/** Appraisal file of one level and one ribbed scheme, unless given otherwise. */
export function fileOf(panels: readonly Panel[], given: object = {}): AppraisalFile {
  return appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief: { basis: 'EN1992', imposedLoad: 2, cover: 25, fireMinutes: 60, fck: 25, fyk: 500 },
    levels: [{ mark: 'L1', panels }],
    schemes: [ribbedScheme()],
    ...given,
  })
}
