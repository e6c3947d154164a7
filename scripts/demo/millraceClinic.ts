import { edgesOf, panelOf, rectangle } from './demoPanels'
import { DEMO_FACTORS } from './demoFactors'
import type { DemoProject } from './demoProject'
import { ribbedScheme, solidScheme } from './demoSchemes'
import { inRatesOf, leftOutOf, pricedIn } from './demoScope'

const BEAM = 300

/** Three storeys of treatment rooms on a corridor: two rows of bays with a narrow one between. */
export const MILLRACE_CLINIC: DemoProject = {
  region: 'Norvane',
  project: {
    name: 'Millrace Clinic',
    reference: 'MC-11',
    place: 'Ostrel Isles, Norvane',
    use: 'A',
    brief: {
      basis: 'EN1992',
      imposedLoad: 3,
      finishesLoad: 1.4,
      servicesLoad: 0.5,
      partitionsLoad: 1,
      cover: 25,
      fireMinutes: 60,
      redistribution: 0,
      stockLength: 12_000,
      fck: 30,
      fyk: 500,
      nationalValues: {},
    },
    markups: {
      preliminariesPercent: '13',
      preliminariesFixed: '0',
      preliminariesPerWeek: '0',
      overheadsAndProfitPercent: '0',
      contingencyPercent: '5',
      taxPercent: '6',
    },
    measurement: 'comparing',
    scope: [
      ...inRatesOf(['R1', 'R2', 'S1'], ['deck', 'propping', 'hoisting', 'tiesChairsLinks', 'trimmingBars']),
      pricedIn('R1', 'ceiling', '8.60', 'grossArea'),
      pricedIn('R2', 'ceiling', '8.60', 'grossArea'),
      leftOutOf('S1', 'ceiling', 'Soffit is painted as struck; painting is with the finishes'),
      pricedIn('R1', 'ribbedConcrete', '9.80', 'concrete'),
      pricedIn('R2', 'ribbedConcrete', '9.80', 'concrete'),
      ...inRatesOf(['S1'], ['ribbedConcrete']),
    ],
    factors: DEMO_FACTORS,
  },
  levels: [
    {
      mark: 'L1',
      name: 'Levels 1 and 2, treatment',
      repeat: 2,
      proppingHeight: 3100,
      panels: [
        panelOf('P1', rectangle(0, 0, 5400, 5700), edgesOf('dccd', BEAM)),
        panelOf('P2', rectangle(5400, 0, 5400, 5700), edgesOf('dccc', BEAM)),
        panelOf('P3', rectangle(10_800, 0, 5400, 5700), edgesOf('ddcc', BEAM)),
        panelOf('P4', rectangle(0, 5700, 5400, 2700), edgesOf('cccd', BEAM)),
        panelOf('P5', rectangle(5400, 5700, 5400, 2700), edgesOf('cccc', BEAM)),
        panelOf('P6', rectangle(10_800, 5700, 5400, 2700), edgesOf('cdcc', BEAM)),
        panelOf('P7', rectangle(0, 8400, 5400, 5700), edgesOf('ccdd', BEAM)),
        panelOf('P8', rectangle(5400, 8400, 5400, 5700), edgesOf('ccdc', BEAM)),
        panelOf('P9', rectangle(10_800, 8400, 5400, 5700), edgesOf('cddc', BEAM), {
          voids: [rectangle(12_600, 9900, 2400, 2600)],
        }),
      ],
    },
    {
      mark: 'R',
      name: 'Roof slab',
      repeat: 1,
      proppingHeight: 3100,
      panels: [
        panelOf('P1', rectangle(0, 0, 5400, 5700), edgesOf('dccd', BEAM)),
        panelOf('P2', rectangle(5400, 0, 5400, 5700), edgesOf('dccc', BEAM)),
        panelOf('P3', rectangle(10_800, 0, 5400, 5700), edgesOf('ddcc', BEAM)),
        panelOf('P4', rectangle(0, 5700, 5400, 2700), edgesOf('cccd', BEAM)),
        panelOf('P5', rectangle(5400, 5700, 5400, 2700), edgesOf('cccc', BEAM)),
        panelOf('P6', rectangle(10_800, 5700, 5400, 2700), edgesOf('cdcc', BEAM)),
        panelOf('P7', rectangle(0, 8400, 5400, 5700), edgesOf('ccdd', BEAM)),
        panelOf('P8', rectangle(5400, 8400, 5400, 5700), edgesOf('ccdc', BEAM)),
        panelOf('P9', rectangle(10_800, 8400, 5400, 5700), edgesOf('cddc', BEAM)),
      ],
    },
  ],
  schemes: [
    ribbedScheme('R1', 'Ribbed, 200 mm clay blocks', 'HC 200', { ribWidth: 120, topping: 80, mesh: 'A142' }),
    ribbedScheme('R2', 'Ribbed, 200 mm concrete blocks', 'SQ 200', { ribWidth: 120, topping: 80, mesh: 'A142' }),
    solidScheme('S1', 'Solid, least thickness'),
  ],
}
