import { comparisonSections } from '#shared/drawing/comparisonSections'
import type { SectionSubject } from '#shared/drawing/sectionBody'
import type { FrozenComparison } from '../../../server/reports/frozenComparison'
import type { RibbedScheme, SolidScheme } from '#shared/contracts/appraisal'
import type { Check } from '#shared/contracts/appraisalResult'

const ribbedScheme: RibbedScheme = {
  mark: 'R1',
  kind: 'ribbed',
  block: { length: 200, width: 400, height: 200, mass: 9.6 },
  ribWidth: 120,
  topping: 50,
  mesh: 'A142',
  edgeStrip: 0,
  solidZone: 'least',
  crossRibs: 'none',
  trimmerWidth: 100,
  cutBlocks: false,
  leastPiece: 50,
  alignRows: false,
  ribBars: 'computed',
  topBars: 'computed',
  givenPanels: [],
  link: 8,
}
const solidScheme: SolidScheme = {
  mark: 'S1',
  kind: 'solid',
  thickness: 'least',
  thicknessPer: 'scheme',
  bars: 'computed',
  givenPanels: [],
}

const check = (name: Check['name'], clause: string, utilisation: number, panel = 'P1'): Check => ({
  level: 'L1',
  panel,
  name,
  clause,
  demand: utilisation,
  capacity: 1,
  unit: 'kNm',
  utilisation,
  pass: utilisation <= 1,
  working: '',
})

function sections(): FrozenComparison['sections'] {
  const ribbed: SectionSubject = {
    scheme: ribbedScheme,
    depthMm: 250,
    reinforcement: {
      coverMm: 25,
      ribBars: [{ diameter: 12, count: 2 }],
      cutLayer: null,
      lyingLayer: null,
    },
  }
  const solid: SectionSubject = {
    scheme: solidScheme,
    depthMm: 200,
    reinforcement: {
      coverMm: 25,
      ribBars: [],
      cutLayer: { diameter: 10, spacing: 200 },
      lyingLayer: { diameter: 10, spacing: 200 },
    },
  }
  return {
    wide: comparisonSections({ ribbed, solid }, { id: 'wide', widthPx: 788 }),
    narrow: comparisonSections({ ribbed, solid }, { id: 'narrow', widthPx: 328 }),
  }
}

/** A comparison with invented figures, for tests of the report and the mail; `change` replaces whole fields. */
export function frozenExample(change: Partial<FrozenComparison> = {}): FrozenComparison {
  const deadLoads = { ribbed: { perArea: 4.09, total: 4051.2 }, solid: { perArea: 5, total: 4957 } }
  return {
    format: 'bothways.comparison/1',
    frozenAt: '2026-03-14T09:30:00.000Z',
    firm: { name: 'Quillmark Surveyors', isDemo: true },
    project: {
      id: '0197a4a0-0000-7000-8000-000000000001',
      name: 'Tarn Court',
      reference: 'TC-06',
      place: 'Eastmere, Ostrel Isles',
      use: 'A',
    },
    recipient: { name: 'Client of Tarn Court', email: 'client@example.test' },
    preparedBy: 'Surveyor of Quillmark',
    note: 'As agreed on Monday, for the four typical floors.',
    brief: {
      basis: 'EN1992',
      imposedLoad: 2,
      finishesLoad: 1.2,
      servicesLoad: 0,
      partitionsLoad: 1,
      cover: 25,
      fireMinutes: 60,
      redistribution: 0,
      stockLength: 12_000,
      fck: 25,
      fyk: 500,
      nationalValues: {},
    },
    edition: { region: 'Eastmere', number: 4, currency: 'USD', baseDate: '2026-03-01', taxBasis: 'before tax' },
    floor: { areaM2: 991.44, floorCount: 4, panelCount: 28 },
    ribbed: {
      specification: ribbedScheme,
      name: 'hollow blocks 200',
      depth: 250,
      passes: true,
      checkCount: 84,
      failedCount: 0,
      checks: [
        check('flexure.midspan', 'EN 1992-1-1:2004, 3.1.7', 0.91, 'P3'),
        check('shear', 'EN 1992-1-1:2004, 6.2.2', 0.88, 'P2'),
        check('deflection', 'EN 1992-1-1:2004, 7.4.2', 0.94),
        check('fire.size', 'EN 1992-1-2:2004, Table 5.5', 0.96),
      ],
      deadLoad: deadLoads.ribbed,
      quantities: [
        { item: 'concrete.slab', unit: 'm³', net: 135.6 },
        { item: 'blocks.whole', unit: 'nr', net: 7016 },
        { item: 'steel.bar.12', unit: 't', net: 6.201 },
        { item: 'steel.mesh.A142', unit: 'm²', net: 908.05 },
      ],
      total: '80030.08',
      perArea: '80.72',
    },
    solid: {
      specification: solidScheme,
      name: 'least thickness',
      depth: 200,
      passes: true,
      checkCount: 70,
      failedCount: 0,
      checks: [
        check('flexure.midspan', 'EN 1992-1-1:2004, 3.1.7', 0.72),
        check('deflection', 'EN 1992-1-1:2004, 7.4.2', 0.97),
        check('fire.size', 'EN 1992-1-2:2004, Table 5.8', 0.4),
      ],
      deadLoad: deadLoads.solid,
      quantities: [
        { item: 'concrete.slab', unit: 'm³', net: 198.29 },
        { item: 'steel.bar.10', unit: 't', net: 9.678 },
      ],
      total: '84134.67',
      perArea: '84.86',
    },
    groups: [
      { label: 'Concrete, bars and mesh', difference: '-10960.32', sway: '-12659.17' },
      { label: 'Blocks and closing of their ends', difference: '7406.56', sway: '8554.58' },
      { label: 'Preliminaries and contingency', difference: '-550.83', sway: null },
    ],
    markups: ['preliminaries', 'contingency'],
    sections: sections(),
    ...change,
  }
}
