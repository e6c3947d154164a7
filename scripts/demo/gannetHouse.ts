import { edgesOf, panelOf, rectangle } from './demoPanels'
import type { DemoProject } from './demoProject'
import { ribbedScheme, solidScheme } from './demoSchemes'

const BEAM = 300

/** Offices with longer spans round a court: an L-shaped corner bay with a stair in it. */
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
        panelOf('P1', rectangle(0, 0, 7200, 7500), edgesOf('dccd', BEAM)),
        panelOf('P2', rectangle(7200, 0, 7200, 7500), edgesOf('dcdc', BEAM)),
        panelOf(
          'P3',
          [
            [14_400, 0],
            [21_600, 0],
            [21_600, 7500],
            [17_400, 7500],
            [17_400, 10_500],
            [14_400, 10_500],
          ],
          edgesOf('dddddc', BEAM),
          { voids: [rectangle(15_000, 7400, 1500, 2300)] },
        ),
        panelOf('P4', rectangle(0, 7500, 7200, 7500), edgesOf('cddd', BEAM)),
      ],
    },
  ],
  schemes: [
    ribbedScheme('R1', 'Ribbed, 250 mm clay blocks', 'HC 250', { ribWidth: 140, topping: 80, mesh: 'A142' }),
    solidScheme('S1', 'Solid, least thickness'),
  ],
}
