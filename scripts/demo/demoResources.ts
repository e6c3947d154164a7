import type { GangInput, QuotationInput, ResourceInput } from '#shared/contracts/resource'

const LIST = 'Demo data, invented; no real price list'
const WAGES = 'Demo data, invented; no real wage agreement'
const HIRE = 'Demo data, invented; no real hire list'

type Row = readonly [code: string, description: string, unit: string, low: string, likely: string, high: string]

const priced = (kind: ResourceInput['kind'], source: string, sourceDate: string, rows: readonly Row[]): ResourceInput[] =>
  rows.map(([code, description, unit, low, likely, high]) => ({
    ...{ code, kind, description, unit, source, sourceDate },
    price: { low, likely, high },
  }))

/** What Eastmere's rates are built up from, USD of September 2026. Prices with cents are chosen so that the rates stay as published. */
export const DEMO_RESOURCES: readonly ResourceInput[] = [
  ...priced('material', LIST, '2026-08-24', [
    ['MIX-C30', 'Ready-mixed concrete C25/30, 10 mm stone, delivered', 'm³', '103.47', '110.92', '123.85'],
    ['CURE-SHEET', 'Sheet over fresh concrete, used again', 'm²', '0.30', '0.35', '0.45'],
    ['HC 150', 'Hollow clay block 400 × 150, delivered', 'nr', '0.54', '0.62', '0.75'],
    ['HC 200', 'Hollow clay block 400 × 200, delivered', 'nr', '0.61', '0.70', '0.85'],
    ['HC 250', 'Hollow clay block 400 × 250, delivered', 'nr', '0.70', '0.81', '0.98'],
    ['DV 165', 'Hollow clay block 355 × 165, delivered', 'nr', '0.58', '0.66', '0.80'],
    ['SQ 200', 'Hollow concrete block 400 × 200, delivered', 'nr', '0.66', '0.74', '0.88'],
    ['LA 240', 'Lightweight block 480 × 240, delivered', 'nr', '1.12', '1.28', '1.55'],
    ['BAR-12', 'High-yield bars 12 mm, cut and bent, delivered', 't', '661.60', '724.26', '840.45'],
    ['WIRE-TIE', 'Tying wire', 'kg', '1.40', '1.60', '1.90'],
    ['SPACER', 'Spacers and chairs', 'nr', '0.06', '0.08', '0.11'],
    ['MESH-A142', 'Welded mesh A142, sheets of 4.8 × 2.4 m', 'm²', '2.20', '2.45', '2.83'],
    ['PLY-18', 'Film-faced plywood 18 mm', 'm²', '12.80', '14.20', '16.90'],
    ['NAILS', 'Nails and fixings', 'kg', '1.70', '1.90', '2.30'],
    ['RELEASE-OIL', 'Release oil', 'l', '1.60', '1.85', '2.20'],
    ['PROP-SET', 'Props and forkheads on hire, for 1 m² and one pour', 'm²', '2.02', '2.59', '3.69'],
    ['DIESEL', 'Diesel delivered to site', 'l', '1.05', '1.18', '1.35'],
  ]),
  ...priced('material', LIST, '2025-06-16', [['TIMBER', 'Sawn softwood for joists and bearers', 'm³', '310', '345', '420']]),
  ...priced('labour', WAGES, '2026-07-01', [
    ['FOREMAN', 'Foreman, all in', 'h', '9.60', '10.40', '11.50'],
    ['CONCRETOR', 'Concretor, all in', 'h', '6.30', '6.80', '7.60'],
    ['FIXER', 'Steel fixer, all in', 'h', '7.10', '7.60', '8.40'],
    ['CARPENTER', 'Formwork carpenter, all in', 'h', '7.60', '8.20', '9.10'],
    ['HELPER', 'Helper, all in', 'h', '4.10', '4.40', '5.00'],
  ]),
  ...priced('plant', HIRE, '2026-08-10', [
    ['PUMP-36', 'Concrete pump, 36 m boom, with driver', 'h', '74', '82', '95'],
    ['POKERS', 'Two poker vibrators', 'h', '3.20', '3.60', '4.30'],
    ['HOIST', 'Material hoist with driver', 'h', '9.50', '10.50', '12.40'],
  ]),
]

/** Gangs of Eastmere. */
export const DEMO_GANGS: readonly GangInput[] = [
  {
    code: 'gang.pour',
    description: 'Pouring gang: foreman, four concretors, two helpers',
    members: [
      { resource: 'FOREMAN', count: '1' },
      { resource: 'CONCRETOR', count: '4' },
      { resource: 'HELPER', count: '2' },
    ],
  },
  { code: 'gang.blocks', description: 'One helper laying blocks', members: [{ resource: 'HELPER', count: '1' }] },
  { code: 'gang.steel', description: 'One steel fixer', members: [{ resource: 'FIXER', count: '1' }] },
  {
    code: 'gang.deck',
    description: 'Deck gang: two carpenters, one helper',
    members: [
      { resource: 'CARPENTER', count: '2' },
      { resource: 'HELPER', count: '1' },
    ],
  },
]

/** A quotation and whether it is the chosen one. */
export interface DemoQuotation extends QuotationInput {
  readonly isChosen: boolean
}

/** Suppliers' prices side by side; the firms are invented. The least and the most are the low and the high price of the resource. */
export const DEMO_QUOTATIONS: readonly DemoQuotation[] = [
  bars('Ostrel Steel Stockholders', '724.26', 'OS 2218', '2026-08-21', true),
  bars('Breakwater Bar and Mesh', '661.60', 'ex works, ship of October', '2026-08-25'),
  bars('Longquay Reinforcement', '840.45', 'LR/26/0419', '2026-08-18'),
  blocks('Harrowcombe Clayworks', '84.00', '120', 'HW 1173', '2027-02-28', true),
  blocks('Dunvale Brick and Tile', '58.56', '96', 'collected at the kiln', '2027-02-28'),
  blocks('Saltmere Kiln', '102.00', '120', 'SK 88', '2026-11-15'),
]

function bars(supplier: string, price: string, reference: string, day: string, isChosen = false): DemoQuotation {
  return { resource: 'BAR-12', supplier, price, contains: '1', reference, day, validUntil: '2027-02-28', isChosen }
}

function blocks(
  supplier: string,
  price: string,
  contains: string,
  reference: string,
  validUntil: string,
  isChosen = false,
): DemoQuotation {
  return { resource: 'HC 200', supplier, price, contains, reference, day: '2026-08-19', validUntil, isChosen }
}
