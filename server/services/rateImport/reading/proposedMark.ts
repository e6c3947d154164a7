/** A mark that can only be a decimal mark: it stands last, and not before exactly three digits, or the other mark stands before it. */
function markOf(text: string): '.' | ',' | null {
  const last = /([.,])(\d*)\D*$/.exec(text)
  if (last === null) return null
  const [, mark, digits] = last as unknown as [string, '.' | ',', string]
  const other = mark === '.' ? ',' : '.'
  const before = text.slice(0, last.index)
  if (before.includes(mark)) return other === ',' || other === '.' ? (before.includes(other) ? null : other) : null
  return digits.length !== 3 || before.includes(other) ? mark : null
}

/** Decimal mark of prices typed as text, by those that leave no doubt; a point where none does. */
export function proposedMark(texts: readonly string[]): '.' | ',' {
  const marks = texts.map(markOf)
  const commas = marks.filter((mark) => mark === ',').length
  const points = marks.filter((mark) => mark === '.').length
  return commas > points ? ',' : '.'
}
