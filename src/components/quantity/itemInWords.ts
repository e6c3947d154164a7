import type { ItemCode } from '#shared/contracts/appraisal'

/** Sections of the bill, in the order they are built. */
export type WorkSection = 'Formwork and propping' | 'Blocks' | 'Reinforcement' | 'Concrete work'
export const WORK_SECTIONS: readonly WorkSection[] = ['Formwork and propping', 'Blocks', 'Reinforcement', 'Concrete work']

const NAMES: Partial<Record<ItemCode, string>> = {
  'concrete.slab': 'Concrete in slabs',
  'blocks.whole': 'Hollow blocks, whole',
  'blocks.cut': 'Hollow blocks, cut',
  'blocks.closedEnds': 'Block ends to close',
  'formwork.soffit': 'Formwork to soffits',
  'formwork.edge': 'Formwork to edges',
  'curing.area': 'Curing',
  'propping.area': 'Propping',
}

/** An item of the bill in the words of the trade. */
export function itemInWords(item: ItemCode): string {
  const [family, kind, size] = item.split('.')
  if (family === 'steel' && kind === 'bar') return `Bars, ${size} mm`
  if (family === 'steel') return `Mesh ${size}`
  return NAMES[item] ?? item
}

/** The same inside a sentence: 'mesh A142', 'bars, 8 mm'. */
export function itemInSentence(item: ItemCode): string {
  const words = itemInWords(item)
  return words.charAt(0).toLowerCase() + words.slice(1)
}

/** Work section that an item is billed under. */
export function workSectionOf(item: ItemCode): WorkSection {
  if (item.startsWith('blocks.')) return 'Blocks'
  if (item.startsWith('steel.')) return 'Reinforcement'
  return item.startsWith('formwork.') || item.startsWith('propping.') ? 'Formwork and propping' : 'Concrete work'
}

/** Items grouped by work section, empty sections left out. */
export function byWorkSection<T extends { readonly item: ItemCode }>(
  rows: readonly T[],
): { readonly section: WorkSection; readonly rows: readonly T[] }[] {
  return WORK_SECTIONS.map((section) => ({ section, rows: rows.filter(({ item }) => workSectionOf(item) === section) })).filter(
    (group) => group.rows.length > 0,
  )
}

/** An expression of the engine as it is read: × for times, a true minus. */
export function expressionInWords(expression: string): string {
  return expression.replaceAll('*', '×').replaceAll('-', '−')
}
