import { edgesOf, panelOf, rectangle } from './demoPanels'
import { DEMO_FACTORS } from './demoFactors'
import type { DemoProject } from './demoProject'
import { ribbedScheme, solidScheme } from './demoSchemes'
import { inRatesOf, leftOutOf, pricedIn } from './demoScope'

const BEAM = 250

/** Four-storey flats: three bays of 6.6 m by 6.0 and 5.4 m, a skew end bay, a stair. */
export const TARN_COURT: DemoProject = {
  region: 'Eastmere',
  project: {
    name: 'Tarn Court',
    reference: 'TC-02',
    place: 'Ostrel Isles, Eastmere',
    use: 'A',
    brief: {
      basis: 'EN1992',
      imposedLoad: 2,
      finishesLoad: 1.2,
      servicesLoad: 0.3,
      partitionsLoad: 0.8,
      cover: 25,
      fireMinutes: 60,
      redistribution: 0,
      stockLength: 12_000,
      fck: 30,
      fyk: 500,
      nationalValues: {},
    },
    markups: {
      preliminariesPercent: '12',
      preliminariesFixed: '0',
      preliminariesPerWeek: '0',
      overheadsAndProfitPercent: '0',
      contingencyPercent: '5',
      taxPercent: '8',
    },
    measurement: 'comparing',
    scope: [
      ...inRatesOf(['R1', 'S1'], ['deck', 'propping', 'hoisting', 'tiesChairsLinks', 'groutLost', 'ribbedConcrete']),
      pricedIn('R1', 'ceiling', '7.20', 'grossArea'),
      pricedIn('S1', 'ceiling', '4.10', 'grossArea'),
      pricedIn('R1', 'floorFinish', '6.50', 'grossArea'),
      pricedIn('S1', 'floorFinish', '6.50', 'grossArea'),
      pricedIn('R1', 'storeyHeight', '5200', 'sum'),
      leftOutOf('S1', 'storeyHeight', 'The thinner floor sets the storey height'),
      leftOutOf('R1', 'loadDirection', 'Beams are the same in both; the frame is not measured here'),
      leftOutOf('S1', 'loadDirection', 'Beams are the same in both; the frame is not measured here'),
    ],
    factors: DEMO_FACTORS,
  },
  levels: [
    {
      mark: 'L1',
      name: 'Level 1, the typical floor',
      repeat: 4,
      proppingHeight: 2700,
      panels: [
        panelOf('P1', rectangle(0, 0, 6600, 6000), edgesOf('dccd', BEAM)),
        panelOf('P2', rectangle(6600, 0, 6600, 6000), edgesOf('dccc', BEAM)),
        panelOf('P3', rectangle(13_200, 0, 6600, 6000), edgesOf('dccc', BEAM)),
        panelOf(
          'P4',
          [
            [19_800, 0],
            [25_800, 0],
            [24_300, 6000],
            [19_800, 6000],
          ],
          edgesOf('dddc', BEAM),
          { ribDirection: 0 },
        ),
        panelOf('P5', rectangle(0, 6000, 6600, 5400), edgesOf('ccdd', BEAM)),
        panelOf('P6', rectangle(6600, 6000, 6600, 5400), edgesOf('ccdc', BEAM)),
        panelOf('P7', rectangle(13_200, 6000, 6600, 5400), edgesOf('cddc', BEAM), {
          voids: [rectangle(15_200, 7700, 2600, 3100)],
        }),
      ],
    },
  ],
  schemes: [
    ribbedScheme('R1', 'Ribbed, 200 mm clay blocks', 'HC 200', { ribWidth: 120, topping: 80, mesh: 'A142' }),
    solidScheme('S1', 'Solid, least thickness'),
  ],
}
