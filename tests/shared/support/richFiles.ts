import type { AppraisalFileInput } from '#shared/contracts/appraisal'
import { rectangle } from './handSized'

type Levels = AppraisalFileInput['levels']
type Rates = NonNullable<AppraisalFileInput['rates']>

const edge = (continuity: 'continuous' | 'discontinuous', kind: 'beam' | 'wall' = 'beam') => ({
  supportWidth: 250,
  kind,
  continuity,
})

/** Two bays in a line and a repeat of each, with a void and a wall. */
const levels: Levels = [
  {
    mark: 'L1',
    repeat: 2,
    proppingHeight: 2700,
    panels: [
      {
        mark: 'P1',
        repeat: 3,
        outline: rectangle(0, 0, 6210, 5070),
        edges: [
          edge('discontinuous', 'wall'),
          { ...edge('continuous'), beyond: { panel: 'P2' } },
          edge('discontinuous'),
          edge('discontinuous'),
        ],
        ribDirection: 0,
        voids: [rectangle(2000, 2000, 2100, 700)],
      },
      {
        mark: 'P2',
        repeat: 3,
        outline: rectangle(6210, 0, 5630, 5070),
        edges: [
          edge('discontinuous'),
          { ...edge('continuous'), beyond: { span: 5000 } },
          edge('discontinuous'),
          edge('continuous'),
        ],
        ribDirection: 0,
        voids: [],
      },
    ],
  },
]

const rates: Rates = {
  currency: 'USD',
  items: {
    'concrete.slab': '168.40',
    'blocks.whole': '1.92',
    'blocks.cut': '2.35',
    'blocks.closedEnds': '0.46',
    'steel.mesh.A142': '4.85',
    'formwork.soffit': '21.60',
    'formwork.edge': '9.75',
    'curing.area': '0.62',
    'propping.area': '4.30',
  },
  byScheme: { R1: { 'concrete.slab': '171.25' } },
  markups: {
    preliminariesPercent: '11',
    preliminariesFixed: '2500',
    preliminariesPerWeek: '640',
    overheadsAndProfitPercent: '8',
    contingencyPercent: '5',
    taxPercent: '7.5',
  },
}

const invented = { source: 'invented', date: '2026-09-01' }

/** Something of every kind that a same-scope list and carbon factors can say. */
const declared: Pick<AppraisalFileInput, 'scope' | 'factors'> = {
  scope: [
    { scheme: 'R1', entry: 'ceiling', state: 'priced', rate: '7.2', per: 'grossArea', note: 'plaster' },
    { scheme: 'S1', entry: 'ceiling', state: 'leftOut', note: 'painted' },
    { scheme: 'R1', entry: 'groutLost', state: 'priced', rate: '0.06', per: 'blocks' },
    { scheme: 'R1', entry: 'ribbedConcrete', state: 'priced', rate: '9.8', per: 'concrete' },
    { scheme: 'S1', entry: 'tiesChairsLinks', state: 'priced', rate: '31', per: 'steel' },
    { scheme: 'R1', entry: 'hoisting', state: 'priced', rate: '1200', per: 'sum' },
    { scheme: 'S1', entry: 'hoisting', state: 'inRates', note: 'crane is there' },
  ],
  factors: {
    carbon: [
      { material: 'concrete', modules: 'A1-A3', value: 250, unit: 'm³', wastePercent: 3, ...invented },
      { material: 'bars', modules: 'A1-A3', value: 1100, unit: 't', wastePercent: 4, ...invented },
      { material: 'mesh', modules: 'A1-A3', value: 3, unit: 'm²', ...invented },
      { material: 'blocks', modules: 'A4', value: 0.2, unit: 'nr', ...invented },
      { material: 'formwork', modules: 'A1-A3', value: 9, unit: 'm²', uses: 8, ...invented },
    ],
  },
}

const block = { length: 200, width: 400, height: 200, mass: 12.5 }
const loads = {
  imposedLoad: 2,
  finishesLoad: 1.5,
  servicesLoad: 0.3,
  partitionsLoad: 0.8,
  cover: 25,
  fireMinutes: 60,
  redistribution: 10,
  stockLength: 6000,
} as const

/** Every value that a country chooses, as recommended, and a cap of span to depth. */
const nationalValues = {
  gammaPermanent: 1.35,
  gammaVariable: 1.5,
  gammaConcrete: 1.5,
  gammaSteel: 1.15,
  alphaCc: 0.85,
  redistributionK1: 0.44,
  redistributionK2: 1.25,
  vMinCoefficient: 0.035,
  greatestSteelFactor: 1.5,
  greatestSpanDepth: 70,
}

/** A file in which every field of EN 1992-1-1 schemes with sizes left to the engine has something to do. */
export const computedFile: AppraisalFileInput = {
  format: 'bothways.appraisal/1',
  brief: { basis: 'EN1992', ...loads, exposure: 'XC1', fck: 30, fyk: 500, nationalValues },
  levels,
  schemes: [
    {
      mark: 'R1',
      kind: 'ribbed',
      block,
      ribWidth: 120,
      topping: 60,
      mesh: 'A142',
      edgeStrip: 50,
      solidZone: 'least',
      crossRibs: 'rule',
      trimmerWidth: 150,
      cutBlocks: true,
      leastPiece: 50,
      ribBars: 'computed',
      topBars: 'computed',
      link: 6,
    },
    { mark: 'S1', kind: 'solid', thickness: 'least', bars: 'computed' },
  ],
  rates,
  ...declared,
  measurement: 'nrm2',
}

/** The same floor with sizes, bars and cross ribs given. */
export const givenFile: AppraisalFileInput = {
  ...computedFile,
  schemes: [
    {
      mark: 'R1',
      kind: 'ribbed',
      block,
      ribWidth: 120,
      topping: 60,
      mesh: 'A142',
      edgeStrip: 50,
      solidZone: 250,
      crossRibs: { every: 2000, width: 100 },
      trimmerWidth: 150,
      cutBlocks: true,
      leastPiece: 50,
      ribBars: [{ diameter: 12, count: 2 }],
      topBars: [{ diameter: 12, count: 2 }],
      givenPanels: [{ level: 'L1', panel: 'P2', ribBars: [{ diameter: 20, count: 1 }], topBars: [{ diameter: 10, count: 2 }] }],
      link: 0,
    },
    {
      mark: 'S1',
      kind: 'solid',
      thickness: 175,
      thicknessNote: 'as the engineer asked',
      bars: {
        bottomX: { diameter: 10, spacing: 150 },
        bottomY: { diameter: 10, spacing: 175 },
        topX: { diameter: 10, spacing: 150 },
        topY: { diameter: 8, spacing: 200 },
      },
      givenPanels: [
        {
          level: 'L1',
          panel: 'P2',
          bars: {
            bottomX: { diameter: 12, spacing: 150 },
            bottomY: { diameter: 10, spacing: 200 },
            topX: { diameter: 12, spacing: 200 },
            topY: { diameter: 8, spacing: 175 },
          },
        },
      ],
    },
  ],
}

/** The floor by BS 8110, with a panel beside it that is simple all round and whose corners may lift. */
export const britishFile: AppraisalFileInput = {
  ...computedFile,
  brief: { basis: 'BS8110', ...loads, exposure: 'mild', fcu: 37, fy: 460, nationalValues: { gammaSteel: 1.15 } },
  levels: [
    ...levels,
    {
      mark: 'L2',
      panels: [
        {
          mark: 'P3',
          outline: rectangle(0, 0, 5010, 4070),
          edges: [edge('discontinuous')],
          ribDirection: 90,
          corners: 'mayLift',
        },
      ],
    },
  ],
}
