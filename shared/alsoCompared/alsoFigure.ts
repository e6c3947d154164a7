/** What is compared beside the cost, in the order it is read. */
export const FIGURE_KEYS = [
  'deadLoadArea',
  'deadLoadTotal',
  'steelArea',
  'steelVolume',
  'labourHours',
  'gangDays',
  'formworkWeeks',
  'proppingWeeks',
  'soffitArea',
  'soffitAreaWeeks',
  'propAreaWeeks',
  'carbonProduct',
  'carbonTransport',
  'carbonConstruction',
  'carbonTotal',
  'soundAir',
  'soundImpact',
  'fire',
] as const
export type FigureKey = (typeof FIGURE_KEYS)[number]

/** One figure of one scheme, with how it came about. */
export interface AlsoFigure {
  readonly key: FigureKey
  /** In the unit of its key; null where nothing can be said, and `working` tells why. */
  readonly value: number | null
  /** The formula with its numbers, or why there is no figure. */
  readonly working: string
  readonly source: string
  /** What is missing, and so not in the value, by name. */
  readonly lacks: readonly string[]
}
