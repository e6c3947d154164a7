const DELIMITERS = [';', '\t', ',', '|'] as const
export type Delimiter = (typeof DELIMITERS)[number]
const LOOKED_AT = 60

/** How often each delimiter stands in a line, outside quotes. */
function countsIn(line: string): number[] {
  const bare = line.replace(/"[^"]*"?/g, '')
  return DELIMITERS.map((sign) => bare.split(sign).length - 1)
}

/**
 * Sign between the columns of a text: the one that most lines have, equally often; a semicolon goes before a comma, which may be a decimal
 * mark. A text with none of them has one column.
 */
export function delimiterOf(text: string): Delimiter {
  const lines = text.slice(0, 200_000).split(/\r\n|\n|\r/).filter((line) => line.trim() !== '').slice(0, LOOKED_AT) // prettier-ignore
  const counts = lines.map(countsIn)
  const scores = DELIMITERS.map((_, index) => {
    const found = new Map<number, number>()
    for (const row of counts) if (row[index]! > 0) found.set(row[index]!, (found.get(row[index]!) ?? 0) + 1)
    return Math.max(0, ...found.values())
  })
  const best = Math.max(...scores)
  return best === 0 ? ',' : DELIMITERS[scores.indexOf(best)]!
}
