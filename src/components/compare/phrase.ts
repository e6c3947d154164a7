/** A piece of a sentence; words that stand for a scheme carry its kind, so that they are set in its colour. */
export interface Phrase {
  readonly text: string
  readonly kind?: 'ribbed' | 'solid'
}

/** The sentence as plain text. */
export function plainText(phrases: readonly Phrase[]): string {
  return phrases.map(({ text }) => text).join('')
}

/** Two schemes under comparison. */
export interface Pair<T> {
  readonly ribbed: T
  readonly solid: T
}
