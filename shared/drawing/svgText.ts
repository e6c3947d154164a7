import type { SvgNode } from './svgNode'

const ESCAPES: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' }

/** Text as it may stand in SVG or HTML, inside elements and inside quoted attributes. */
export function escapeMarkup(text: string): string {
  return text.replace(/[&<>"']/g, (character) => ESCAPES[character] ?? character)
}

function attributesText(attributes: SvgNode['attributes']): string {
  return Object.entries(attributes)
    .map(([name, value]) => ` ${name}="${escapeMarkup(String(value))}"`)
    .join('')
}

/** The drawing as markup for a page that is not built by the client: every text and attribute value is escaped. */
export function svgText(node: SvgNode): string {
  const children = node.children.map((child) => (typeof child === 'string' ? escapeMarkup(child) : svgText(child)))
  return `<${node.tag}${attributesText(node.attributes)}>${children.join('')}</${node.tag}>`
}
