import type { ItemCode } from '#shared/contracts/appraisal'

/** Invented price of an item in Eastmere, USD, and how far quotations lie apart. */
interface DemoRate {
  readonly item: ItemCode
  readonly description: string
  readonly unit: string
  readonly likely: number
  /** Low and high as shares of the likely price. */
  readonly range: readonly [number, number]
  /** What moves it from place to place. */
  readonly trade: 'concrete' | 'blocks' | 'steel' | 'labour'
}

const bar = (diameter: string, likely: number): DemoRate => ({
  item: `steel.bar.${diameter}` as ItemCode,
  description: `High-yield bars ${diameter} mm, cut, bent and fixed`,
  unit: 't',
  likely,
  range: [0.92, 1.14],
  trade: 'steel',
})
const mesh = (reference: string, likely: number): DemoRate => ({
  item: `steel.mesh.${reference}` as ItemCode,
  description: `Welded mesh ${reference}, laid, laps in the rate`,
  unit: 'm²',
  likely,
  range: [0.9, 1.15],
  trade: 'steel',
})

export const DEMO_RATES: readonly DemoRate[] = [
  {
    item: 'concrete.slab',
    description: 'Reinforced concrete in suspended slabs, pumped, placed and finished',
    unit: 'm³',
    likely: 149.63,
    range: [0.93, 1.12],
    trade: 'concrete',
  },
  {
    item: 'blocks.whole',
    description: 'Hollow blocks, delivered and laid in rows on the deck',
    unit: 'nr',
    likely: 0.98,
    range: [0.88, 1.2],
    trade: 'blocks',
  },
  {
    item: 'blocks.cut',
    description: 'Hollow blocks cut to length and laid',
    unit: 'nr',
    likely: 1.42,
    range: [0.85, 1.25],
    trade: 'blocks',
  },
  {
    item: 'blocks.closedEnds',
    description: 'Ends of rows of blocks closed before concreting',
    unit: 'nr',
    likely: 0.42,
    range: [0.8, 1.3],
    trade: 'labour',
  },
  bar('6', 1690),
  bar('8', 1620),
  bar('10', 1540),
  bar('12', 1486),
  bar('16', 1440),
  bar('20', 1420),
  bar('25', 1410),
  bar('32', 1430),
  bar('40', 1490),
  mesh('A98', 3.1),
  mesh('A142', 3.95),
  mesh('A193', 5.15),
  mesh('A252', 6.6),
  mesh('A393', 10.1),
  {
    item: 'formwork.soffit',
    description: 'Full deck to soffits, set up and struck',
    unit: 'm²',
    likely: 21.4,
    range: [0.9, 1.18],
    trade: 'labour',
  },
  {
    item: 'formwork.edge',
    description: 'Formwork to edges of slabs and voids',
    unit: 'm',
    likely: 9.2,
    range: [0.88, 1.2],
    trade: 'labour',
  },
  {
    item: 'curing.area',
    description: 'Wet curing of the surface for seven days',
    unit: 'm²',
    likely: 0.62,
    range: [0.8, 1.3],
    trade: 'labour',
  },
  {
    item: 'propping.area',
    description: 'Propping of the deck until struck',
    unit: 'm²',
    likely: 5.8,
    range: [0.9, 1.25],
    trade: 'labour',
  },
]

/** A published or superseded edition of a region's invented prices: the Eastmere price times the factor of its trade. */
export interface DemoEdition {
  readonly number: number
  readonly state: 'published' | 'superseded'
  readonly baseDate: string
  readonly validUntil: string | null
  readonly note: string
  /** Has resources, gangs and quotations, and some of its rates are built up from them. */
  readonly isBuiltUp?: true
  readonly factors: Readonly<Record<DemoRate['trade'], number>>
}

export const DEMO_BOOKS: readonly { region: string; editions: readonly DemoEdition[] }[] = [
  {
    region: 'Eastmere',
    editions: [
      {
        number: 3,
        state: 'superseded',
        baseDate: '2026-03-02',
        validUntil: '2026-08-31',
        note: 'Demo data, invented. Port city: cement and steel by sea, blocks from the two kilns inland.',
        factors: { concrete: 0.96, blocks: 0.95, steel: 1.08, labour: 0.97 },
      },
      {
        number: 4,
        state: 'published',
        baseDate: '2026-09-01',
        validUntil: '2027-02-28',
        note: 'Demo data, invented. Steel fell since edition 3, cement and wages rose.',
        isBuiltUp: true,
        factors: { concrete: 1, blocks: 1, steel: 1, labour: 1 },
      },
    ],
  },
  {
    region: 'Caldrith',
    editions: [
      {
        number: 2,
        state: 'published',
        baseDate: '2026-09-01',
        validUntil: '2027-02-28',
        note: 'Demo data, invented. Inland: the kilns are near, cement and steel come by road.',
        factors: { concrete: 1.07, blocks: 0.82, steel: 1.05, labour: 0.93 },
      },
    ],
  },
  {
    region: 'Norvane',
    editions: [
      {
        number: 1,
        state: 'published',
        baseDate: '2026-09-15',
        validUntil: null,
        note: 'Demo data, invented. Outer islands: everything comes by barge, and light bulky blocks cost most to carry.',
        factors: { concrete: 1.24, blocks: 3.4, steel: 1.12, labour: 1.08 },
      },
    ],
  },
]
