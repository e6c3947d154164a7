import { edgesOf, panelOf, rectangle } from './demoPanels'
import { DEMO_FACTORS } from './demoFactors'
import type { DemoProject } from './demoProject'
import { ribbedScheme, solidScheme } from './demoSchemes'
import { inRatesOf, pricedIn } from './demoScope'

const BEAM = 300

/** Offices with longer spans one way, on frames 7.5 and 8.1 m apart: an L-shaped end bay with a stair in it. */
export const GANNET_HOUSE: DemoProject = {
  region: 'Caldrith',
  project: {
    name: 'Gannet House',
    reference: 'GH-05',
    place: 'Ostrel Isles, Caldrith',
    use: 'B',
    brief: {
      basis: 'EN1992',
      imposedLoad: 2.5,
      finishesLoad: 1,
      servicesLoad: 0.3,
      partitionsLoad: 0.8,
      cover: 25,
      fireMinutes: 60,
      redistribution: 0,
      stockLength: 12_000,
      fck: 35,
      fyk: 500,
      nationalValues: {},
    },
    markups: {
      preliminariesPercent: '15',
      preliminariesFixed: '0',
      preliminariesPerWeek: '0',
      overheadsAndProfitPercent: '0',
      contingencyPercent: '7.5',
      taxPercent: '8',
    },
    measurement: 'comparing',
    scope: [
      ...inRatesOf(['R1', 'R2', 'S1'], ['ceiling', 'deck', 'hoisting', 'tiesChairsLinks', 'leastGang']),
      pricedIn('R1', 'groutLost', '0.06', 'blocks'),
      pricedIn('R2', 'groutLost', '0.06', 'blocks'),
      ...inRatesOf(['S1'], ['groutLost']),
    ],
    factors: DEMO_FACTORS,
  },
  levels: [
    {
      mark: 'L1',
      name: 'Office floors',
      repeat: 3,
      proppingHeight: 3300,
      panels: [
        panelOf('P1', rectangle(0, 0, 7500, 18_000), edgesOf('dcdd', BEAM), { ribDirection: 0 }),
        panelOf('P2', rectangle(7500, 0, 8100, 18_000), edgesOf('dcdc', BEAM), { ribDirection: 0 }),
        panelOf(
          'P3',
          [
            [15_600, 0],
            [23_100, 0],
            [23_100, 12_000],
            [20_100, 12_000],
            [20_100, 18_000],
            [15_600, 18_000],
          ],
          edgesOf('dddddc', BEAM),
          { ribDirection: 0, voids: [rectangle(16_800, 13_200, 2000, 3600)] },
        ),
      ],
    },
  ],
  schemes: [
    ribbedScheme('R1', 'Ribbed, 240 mm lightweight blocks', 'LA 240', { ribWidth: 160, topping: 80, mesh: 'A142' }),
    ribbedScheme('R2', 'Ribbed, 250 mm clay blocks', 'HC 250', { ribWidth: 140, topping: 80, mesh: 'A142' }),
    solidScheme('S1', 'Solid, least thickness'),
  ],
}
