import { factors, type Factors } from '#shared/contracts/factors'

const SOURCE = 'Demo data, invented; no real figure'
const DATE = '2026-09-01'
const invented = { source: SOURCE, date: DATE }
const output = (value: number) => ({ value, source: SOURCE })

/** Labour outputs of a firm that pumps ready-mixed concrete, and carbon factors. Everything invented; none for carrying blocks. */
export const DEMO_FACTORS: Factors = factors.parse({
  labour: {
    concrete: output(1.3),
    barsTo8: output(11.5),
    barsTo12: output(15),
    barsTo20: output(21),
    barsOver20: output(26),
    mesh: output(0.08),
    blocks: output(32),
    soffit: output(1.6),
    edge: output(0.45),
    leastGang: 10,
    hoursPerDay: 8,
  },
  carbon: [
    { material: 'concrete', modules: 'A1-A3', value: 262, unit: 'm³', wastePercent: 3, ...invented },
    { material: 'bars', modules: 'A1-A3', value: 1.18, unit: 'kg', wastePercent: 4, ...invented },
    { material: 'mesh', modules: 'A1-A3', value: 1.31, unit: 'kg', wastePercent: 6, ...invented },
    { material: 'blocks', modules: 'A1-A3', value: 2.15, unit: 'nr', wastePercent: 4, ...invented },
    { material: 'formwork', modules: 'A1-A3', value: 9.4, unit: 'm²', uses: 8, ...invented },
    { material: 'concrete', modules: 'A4', value: 11.5, unit: 'm³', ...invented },
    { material: 'bars', modules: 'A4', value: 0.09, unit: 'kg', ...invented },
  ],
})
