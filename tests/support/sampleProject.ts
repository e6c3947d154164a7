import { randomUUID } from 'node:crypto'
import type { z } from 'zod'
import { levelInput, projectInput, schemeInput } from '../../shared/contracts/project'

type Written<T extends z.ZodType> = z.input<T>

/** A project as it is typed. */
export function sampleProject(changed: Partial<Written<typeof projectInput>> = {}): z.infer<typeof projectInput> {
  return projectInput.parse({
    name: 'Alder Row',
    reference: randomUUID(),
    place: 'Nowhere',
    use: 'A',
    brief: {
      basis: 'EN1992',
      imposedLoad: 2,
      finishesLoad: 1,
      servicesLoad: 0.2,
      partitionsLoad: 0.8,
      cover: 25,
      fireMinutes: 0,
      fck: 30,
      fyk: 500,
    },
    editionId: null,
    markups: { preliminariesPercent: '10', contingencyPercent: '5', taxPercent: '0' },
    ...changed,
  })
}

/** A level of one panel, 6 m × 5 m on beams. */
export function sampleLevel(changed: Partial<Written<typeof levelInput>> = {}): z.infer<typeof levelInput> {
  return levelInput.parse({
    mark: 'L1',
    name: 'Level 1',
    repeat: 2,
    panels: [
      {
        mark: 'P1',
        repeat: 1,
        outline: [
          [0, 0],
          [6000, 0],
          [6000, 5000],
          [0, 5000],
        ],
        edges: [{ supportWidth: 250, kind: 'beam', continuity: 'discontinuous' }],
        ribDirection: 90,
        voids: [],
      },
    ],
    ...changed,
  })
}

/** A ribbed scheme on 200 × 400 × 200 blocks. */
export function sampleRibbed(mark = 'R1', blockId: string | null = null): z.infer<typeof schemeInput> {
  return schemeInput.parse({
    name: 'Ribbed',
    blockId,
    specification: {
      mark,
      kind: 'ribbed',
      block: { length: 200, width: 400, height: 200, mass: 15 },
      ribWidth: 120,
      topping: 60,
      mesh: 'A142',
      solidZone: 'least',
    },
  })
}

/** A solid scheme of the least thickness. */
export function sampleSolid(mark = 'S1'): z.infer<typeof schemeInput> {
  return schemeInput.parse({
    name: 'Solid',
    blockId: null,
    specification: { mark, kind: 'solid', thickness: 'least' },
  })
}
