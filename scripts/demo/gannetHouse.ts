import { edgesOf, panelOf, rectangle } from './demoPanels'
import type { DemoProject } from './demoProject'
import { ribbedScheme, solidScheme } from './demoSchemes'

const BEAM = 300

/** Offices with longer spans one way, on frames 7.2 m apart: an L-shaped end bay with a stair in it. */
export const GANNET_HOUSE: DemoProject = {
  region: 'Norvane',
  project: {
    name: 'Gannet House',
    reference: 'GH-05',
    place: 'Ostrel Isles, Norvane',
    use: 'B',
    brief: {
      basis: 'EN1992',
      imposedLoad: 3,
      finishesLoad: 1,
      servicesLoad: 0.5,
      partitionsLoad: 1,
      cover: 25,
      fireMinutes: 60,
      fck: 35,
      fyk: 500,
    },
    markups: { preliminariesPercent: '15', contingencyPercent: '7.5', taxPercent: '8' },
  },
  levels: [
    {
      mark: 'L1',
      name: 'Office floors',
      repeat: 3,
      panels: [
        panelOf('P1', rectangle(0, 0, 7200, 15_000), edgesOf('dcdd', BEAM), { ribDirection: 0 }),
        panelOf('P2', rectangle(7200, 0, 7200, 15_000), edgesOf('dcdc', BEAM), { ribDirection: 0 }),
        panelOf(
          'P3',
          [
            [14_400, 0],
            [21_600, 0],
            [21_600, 9000],
            [18_600, 9000],
            [18_600, 15_000],
            [14_400, 15_000],
          ],
          edgesOf('dddddc', BEAM),
          { ribDirection: 0, voids: [rectangle(15_600, 10_400, 1800, 3200)] },
        ),
      ],
    },
  ],
  schemes: [
    ribbedScheme('R1', 'Ribbed, 250 mm clay blocks', 'HC 250', { ribWidth: 140, topping: 80, mesh: 'A142' }),
    solidScheme('S1', 'Solid, least thickness'),
  ],
}
