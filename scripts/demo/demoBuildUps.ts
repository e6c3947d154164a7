import type { ItemCode } from '#shared/contracts/appraisal'
import { buildUp, type BuildUp } from '#shared/contracts/buildUp'

const ON_TOP = { overheadsPercent: '8', profitPercent: '5' }
const OUTPUT = 'Demo data, invented; outputs of the trade'

/** How Eastmere's rates are made up, where they are not plain prices. */
export const DEMO_BUILD_UPS: Readonly<Partial<Record<ItemCode, BuildUp>>> = {
  'concrete.slab': buildUp.parse({
    materials: [
      { resource: 'MIX-C30', quantity: '1', wastePercent: '2', source: OUTPUT },
      { resource: 'CURE-SHEET', quantity: '6', uses: 4, source: OUTPUT },
    ],
    labour: [{ gang: 'gang.pour', basis: 'output', value: '4.5', source: OUTPUT }],
    plant: [
      { resource: 'PUMP-36', fuel: { resource: 'DIESEL', perHour: '11' }, outputPerHour: '14', source: OUTPUT },
      { resource: 'POKERS', fuel: { resource: 'DIESEL', perHour: '1.5' }, outputPerHour: '4.5', source: OUTPUT },
    ],
    ...ON_TOP,
  }),
  'blocks.whole': buildUp.parse({
    materials: [{ resource: 'HC 200', quantity: '1', wastePercent: '3', isBlock: true, source: OUTPUT }],
    labour: [{ gang: 'gang.blocks', basis: 'output', value: '40', source: OUTPUT }],
    plant: [{ resource: 'HOIST', outputPerHour: '300', source: OUTPUT }],
    ...ON_TOP,
  }),
  'formwork.soffit': buildUp.parse({
    materials: [
      { resource: 'PLY-18', quantity: '1', wastePercent: '10', uses: 6, source: OUTPUT },
      { resource: 'TIMBER', quantity: '0.03', wastePercent: '8', uses: 8, source: OUTPUT },
      { resource: 'NAILS', quantity: '0.25', source: OUTPUT },
      { resource: 'RELEASE-OIL', quantity: '0.2', source: OUTPUT },
      { resource: 'PROP-SET', quantity: '1', source: OUTPUT },
    ],
    labour: [{ gang: 'gang.deck', basis: 'hours', value: '0.55', source: OUTPUT }],
    plant: [],
    ...ON_TOP,
  }),
  'steel.bar.12': buildUp.parse({
    materials: [
      { resource: 'BAR-12', quantity: '1', wastePercent: '2', source: OUTPUT },
      { resource: 'WIRE-TIE', quantity: '10', source: OUTPUT },
      { resource: 'SPACER', quantity: '160', source: OUTPUT },
    ],
    labour: [{ gang: 'gang.steel', basis: 'output', value: '0.014', source: OUTPUT }],
    plant: [],
    ...ON_TOP,
  }),
  'steel.mesh.A142': buildUp.parse({
    materials: [
      { resource: 'MESH-A142', quantity: '1', wastePercent: '21.9', source: OUTPUT },
      { resource: 'WIRE-TIE', quantity: '0.025', source: OUTPUT },
    ],
    labour: [{ gang: 'gang.steel', basis: 'hours', value: '0.06', source: OUTPUT }],
    plant: [],
    ...ON_TOP,
  }),
}
