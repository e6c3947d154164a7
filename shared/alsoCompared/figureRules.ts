import type { FigureKey } from './alsoFigure'

export type FigureGroup = 'Weight and steel' | 'Labour and time' | 'Formwork and props' | 'Carbon' | 'Sound and fire'

/** How a figure is read and judged. */
export interface FigureRule {
  readonly group: FigureGroup
  readonly label: string
  readonly unit: string
  readonly decimals: number
  /** Which of two values is the better one; 'neither': it is shown and not judged. */
  readonly better: 'less' | 'more' | 'neither'
  /** What the reader must know of it; empty where the label says all. */
  readonly note: string
  /** Why a ribbed floor may be the worse one here. */
  readonly ribbedWorse: string
}

const SCREENING =
  'Screening only: a bare homogeneous floor’s figure, not a building’s; hollows and a thin topping may take some of it away.'
const STRUCK = 'For screening; struck on the engineer’s word only.'
const FRAME = 'What a lighter floor saves in beams, columns and footings is not in.'

/** Why a ribbed floor can be the worse one. */
const WHY = {
  solidZones: 'its solid strips, ribs and blocks outweigh what the hollows save',
  mesh: 'every rib has its bars, and a mesh in the topping comes on top',
  laying: 'blocks are laid one by one before the steel is fixed',
  blocks: 'blocks and mesh count beside its concrete and bars',
  mass: 'less mass stops less sound, and hollows and a thin topping may take more away',
  thin: 'a thin topping and narrow ribs run out first',
} as const

function rule(
  group: FigureGroup,
  label: string,
  unit: string,
  decimals: number,
  better: FigureRule['better'],
  note: string,
  ribbedWorse: string,
): FigureRule {
  return { group, label, unit, decimals, better, note, ribbedWorse }
}

/**
 * What is compared beside the cost, and which way each figure is better.
 *
 * Source: project rule, engine design section 5 (also compared)
 */
export const FIGURE_RULES: Readonly<Record<FigureKey, FigureRule>> = {
  deadLoadArea: rule('Weight and steel', 'Dead load', 'kN/m²', 2, 'less', 'Concrete and blocks.', WHY.solidZones),
  deadLoadTotal: rule('Weight and steel', 'Dead load in all', 'kN', 0, 'less', '', WHY.solidZones),
  steelArea: rule('Weight and steel', 'Steel', 'kg/m²', 2, 'less', 'Bars and mesh, over the gross area.', WHY.mesh),
  steelVolume: rule('Weight and steel', 'Steel in the concrete', 'kg/m³', 1, 'neither', 'kg/m³ flatters thick floors.', ''),
  labourHours: rule('Labour and time', 'Labour', 'man-hours', 0, 'less', 'Curing is not in.', WHY.laying),
  gangDays: rule('Labour and time', 'Least gang', 'days', 1, 'less', '', WHY.laying),
  formworkWeeks: rule('Labour and time', 'Formwork stands, a floor', 'weeks', 2, 'less', STRUCK, WHY.laying),
  proppingWeeks: rule('Labour and time', 'Props stand, a floor', 'weeks', 2, 'less', STRUCK, WHY.laying),
  soffitArea: rule('Formwork and props', 'Soffit formwork', 'm²', 2, 'less', '', ''),
  soffitAreaWeeks: rule('Formwork and props', 'Formwork in use', 'm²·weeks', 0, 'less', STRUCK, WHY.laying),
  propAreaWeeks: rule('Formwork and props', 'Props in use', 'm²·weeks', 0, 'less', STRUCK, WHY.laying),
  carbonProduct: rule('Carbon', 'Materials, A1–A3', 'kg CO2e/m²', 1, 'less', FRAME, WHY.blocks),
  carbonTransport: rule('Carbon', 'Transport, A4', 'kg CO2e/m²', 1, 'less', '', WHY.blocks),
  carbonConstruction: rule('Carbon', 'Waste and formwork, A5', 'kg CO2e/m²', 1, 'less', 'Formwork by its uses.', WHY.blocks),
  carbonTotal: rule('Carbon', 'Counted of these in all', 't CO2e', 1, 'less', FRAME, WHY.blocks),
  soundAir: rule('Sound and fire', 'Airborne sound by mass, Rw', 'dB', 1, 'more', SCREENING, WHY.mass),
  soundImpact: rule('Sound and fire', 'Impact sound by mass, Ln,w,eq', 'dB', 1, 'less', `${SCREENING} No finish in.`, WHY.mass),
  fire: rule('Sound and fire', 'Fire, by the tables', 'min', 0, 'more', 'As sized; the longest standard period.', WHY.thin),
}
