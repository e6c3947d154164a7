/**
 * A drawing as plain data, so that the browser (by Vue) and the report (as text) draw the same thing.
 * Colours come from CSS custom properties and classes, never from literals: a drawing follows the theme of its page.
 * No `style` attribute: the content security policy refuses it.
 */
export interface SvgNode {
  readonly tag:
    | 'svg'
    | 'g'
    | 'path'
    | 'rect'
    | 'line'
    | 'circle'
    | 'polygon'
    | 'polyline'
    | 'text'
    | 'tspan'
    | 'title'
    | 'desc'
    | 'defs'
    | 'pattern'
    | 'clipPath'
    | 'use'
  readonly attributes: Readonly<Record<string, string | number>>
  readonly children: readonly (SvgNode | string)[]
}

/** Makes a node; attributes given as undefined are left out. */
export function svgNode(
  tag: SvgNode['tag'],
  attributes: Record<string, string | number | undefined> = {},
  children: readonly (SvgNode | string)[] = [],
): SvgNode {
  const given = Object.entries(attributes).filter((entry): entry is [string, string | number] => entry[1] !== undefined)
  return { tag, attributes: Object.fromEntries(given), children }
}
