/**
 * The mark that follows the last one: its number one up, skipping those taken.
 *
 * @param marks - marks in use, in order; may be empty
 * @param first - mark of the first of its kind, as P1
 */
export function nextMark(marks: readonly string[], first: string): string {
  const taken = new Set(marks)
  const last = marks.at(-1)
  if (last === undefined) return first
  const [, stem = '', digits = ''] = /^(.*?)(\d*)$/.exec(last) ?? []
  for (let number = digits === '' ? 2 : Number(digits) + 1; ; number += 1) {
    const mark = `${stem}${String(number).padStart(digits.length, '0')}`
    if (!taken.has(mark)) return mark
  }
}
