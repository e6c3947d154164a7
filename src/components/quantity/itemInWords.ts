import { scopeTitle } from '#shared/alsoCompared/scopeWords'
import type { BillItem } from '#shared/contracts/appraisalResult'
import { scopeEntry } from '#shared/contracts/sameScope'

/** Sections of the bill, in the order they are built. */
export type WorkSection = 'Formwork and propping' | 'Blocks' | 'Reinforcement' | 'Concrete work' | 'Declared scope'
export const WORK_SECTIONS: readonly WorkSection[] = [
  'Formwork and propping',
  'Blocks',
  'Reinforcement',
  'Concrete work',
  'Declared scope',
]

const NAMES: Partial<Record<BillItem, string>> = {
  'floor.ribbed': 'Floor of ribs, hollow blocks and topping',
  'floor.solid': 'Solid floor',
  'concrete.slab': 'Concrete in slabs',
  'blocks.whole': 'Hollow blocks, whole',
  'blocks.cut': 'Hollow blocks, cut',
  'blocks.closedEnds': 'Block ends to close',
  'formwork.soffit': 'Formwork to soffits',
  'formwork.edge': 'Formwork to edges',
  'formwork.edgeDeep': 'Formwork to deep edges',
  'curing.area': 'Curing',
  'propping.area': 'Propping',
}

/** An item of the bill in the words of the trade. */
export function itemInWords(item: BillItem): string {
  const [family, kind, size] = item.split('.')
  if (family === 'scope') return scopeTitle(scopeEntry.parse(kind))
  if (family === 'steel' && kind === 'bar') return `Bars, ${size} mm`
  if (family === 'steel') return `Mesh ${size}`
  return NAMES[item] ?? item
}

/** The same inside a sentence: 'mesh A142', 'bars, 8 mm'. */
export function itemInSentence(item: BillItem): string {
  const words = itemInWords(item)
  return words.charAt(0).toLowerCase() + words.slice(1)
}

/** Work section that an item is billed under. */
export function workSectionOf(item: BillItem): WorkSection {
  if (item.startsWith('scope.')) return 'Declared scope'
  if (item.startsWith('blocks.')) return 'Blocks'
  if (item.startsWith('steel.')) return 'Reinforcement'
  return item.startsWith('formwork.') || item.startsWith('propping.') ? 'Formwork and propping' : 'Concrete work'
}

/** Items grouped by work section, empty sections left out. */
export function byWorkSection<T extends { readonly item: BillItem }>(
  rows: readonly T[],
): { readonly section: WorkSection; readonly rows: readonly T[] }[] {
  return WORK_SECTIONS.map((section) => ({ section, rows: rows.filter(({ item }) => workSectionOf(item) === section) })).filter(
    (group) => group.rows.length > 0,
  )
}
