/** Signs that a spreadsheet takes for the beginning of a formula, also full-width, behind spaces and control characters. */
const FORMULA = /^'*[\s\p{Cc}\p{Cf}]*[=+\-@＝＋－＠−]/u

/**
 * Text for a cell of a spreadsheet: where it would begin a formula, an apostrophe goes before it. `typedText` takes that off again,
 * so that each text comes back as it was.
 */
export const harmlessText = (text: string): string => (FORMULA.test(text) || /^[\t\r\n]/.test(text) ? `'${text}` : text)

/** Text of a cell without the one apostrophe that `harmlessText` puts before what would begin a formula. */
export const typedText = (text: string): string =>
  text.startsWith("'") && harmlessText(text.slice(1)) === text ? text.slice(1) : text
