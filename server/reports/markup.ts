import { escapeMarkup } from '#shared/drawing/svgText'

/** Markup that is safe to put into a page: made by `markup`, or said to be safe by `trustedMarkup`. */
export class Markup {
  constructor(readonly text: string) {}

  toString(): string {
    return this.text
  }
}

type Part = Markup | string | number | readonly Part[]

function partText(part: Part): string {
  if (part instanceof Markup) return part.text
  if (typeof part === 'string' || typeof part === 'number') return escapeMarkup(String(part))
  return part.map(partText).join('')
}

/** Template whose parts are escaped, unless they are markup themselves: text is text everywhere. */
export function markup(strings: TemplateStringsArray, ...parts: readonly Part[]): Markup {
  return new Markup(strings.map((string, index) => string + (index < parts.length ? partText(parts[index]!) : '')).join(''))
}

/** Markup of our own making (a drawing, a style sheet): never anything typed by a person. */
export function trustedMarkup(text: string): Markup {
  return new Markup(text)
}
