/** A formula in the manner of spreadsheets, without the sign before it, and the value that it has. */
export interface FormulaCell {
  readonly formula: string
  readonly value: string
}

/** What a cell of an exported sheet holds: text, a decimal, a day, a formula, or nothing. */
export type SheetCell =
  | { readonly kind: 'text'; readonly text: string }
  | { readonly kind: 'number'; readonly decimal: string }
  | { readonly kind: 'day'; readonly iso: string }
  | ({ readonly kind: 'formula' } & FormulaCell)
  | { readonly kind: 'empty' }

export const text = (value: string): SheetCell => (value === '' ? empty : { kind: 'text', text: value })
export const number = (decimal: string): SheetCell => ({ kind: 'number', decimal })
export const day = (iso: string | null): SheetCell => (iso === null ? empty : { kind: 'day', iso })
export const formula = (expression: string, value: string): SheetCell => ({ kind: 'formula', formula: expression, value })
export const empty: SheetCell = { kind: 'empty' }

/** A sheet: its name, its heads, its rows. */
export interface ExportedSheet {
  readonly name: string
  readonly heads: readonly string[]
  readonly rows: readonly (readonly SheetCell[])[]
}

/** Letters of a column counted from 0: A, B, … Z, AA. */
export function columnLetters(index: number): string {
  const rest = Math.floor(index / 26)
  return `${rest === 0 ? '' : columnLetters(rest - 1)}${String.fromCharCode(65 + (index % 26))}`
}
