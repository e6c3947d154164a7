import type { ItemCode } from '#shared/contracts/appraisal'

const WORDS: Readonly<Partial<Record<ItemCode, string>>> = {
  'concrete.slab': 'concrete',
  'blocks.whole': 'blocks',
  'blocks.cut': 'cut blocks',
  'blocks.closedEnds': 'closing of block ends',
  'formwork.soffit': 'formwork to soffits',
  'formwork.edge': 'formwork to edges',
  'formwork.edgeDeep': 'formwork to deep edges',
  'curing.area': 'curing',
  'propping.area': 'propping',
}

/** An item in the words of the report, as 'formwork to soffits', '12 mm bars', 'mesh A142'. */
export function itemText(item: ItemCode): string {
  const [, kind, size] = item.split('.')
  return WORDS[item] ?? (kind === 'bar' ? `${size} mm bars` : `mesh ${size}`)
}
