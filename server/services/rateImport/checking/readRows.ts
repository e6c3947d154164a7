import { createReadStream } from 'node:fs'
import { createInterface } from 'node:readline'
import { setImmediate as pause } from 'node:timers/promises'
import { z } from 'zod'
import type { ReadRow } from '../reading/readRow'

const readRow = z.strictObject({
  sheet: z.int(),
  row: z.int(),
  cells: z.array(z.union([z.string(), z.number()])),
  isHidden: z.boolean(),
})
const AT_ONCE = 500

/** Rows of one sheet as the reading process wrote them; others get their turn in between. */
export async function* readRows(rowsPath: string, sheet: number): AsyncGenerator<ReadRow> {
  const input = createReadStream(rowsPath)
  let count = 0
  try {
    for await (const line of createInterface({ input, crlfDelay: Infinity })) {
      if (++count % AT_ONCE === 0) await pause()
      const row = readRow.parse(JSON.parse(line))
      if (row.sheet === sheet) yield row
    }
  } finally {
    input.destroy()
  }
}
