import type { EntityManager } from 'typeorm'

interface Copy {
  readonly firmId: string
  readonly from: string
  readonly to: string
}

/** Id of the copy of a quotation in another edition, made of both ids, so that what is chosen finds its copy; in the form of version 4. */
const COPIED_ID = `
  CONCAT(LEFT(MD5(CONCAT(q, :to)), 8), '-', SUBSTR(MD5(CONCAT(q, :to)), 9, 4), '-4', SUBSTR(MD5(CONCAT(q, :to)), 14, 3),
    '-a', SUBSTR(MD5(CONCAT(q, :to)), 18, 3), '-', RIGHT(MD5(CONCAT(q, :to)), 12))`
const copiedId = (column: string) => COPIED_ID.replaceAll('CONCAT(q,', `CONCAT(${column},`)

/** Statements in this order: quotations rest on resources. */
const STATEMENTS = [
  `INSERT INTO resource (firm_id, edition_id, code, kind, description, unit, low, likely, high, source, source_date, quotation_id)
   SELECT firm_id, :to, code, kind, description, unit, low, likely, high, source, source_date,
     IF(quotation_id IS NULL, NULL, ${copiedId('quotation_id')}) FROM resource`,
  `INSERT INTO gang (firm_id, edition_id, code, description, members) SELECT firm_id, :to, code, description, members FROM gang`,
  `INSERT INTO quotation (firm_id, id, edition_id, resource, supplier, price, contains, reference, day, valid_until)
   SELECT firm_id, ${copiedId('id')}, :to, resource, supplier, price, contains, reference, day, valid_until FROM quotation`,
  `INSERT INTO rate (firm_id, edition_id, item, description, unit, low, likely, high, source, source_date, build_up)
   SELECT firm_id, :to, item, description, unit, low, likely, high, source, source_date, build_up FROM rate`,
]

/** Copies rates, resources, gangs and quotations of an edition, what is chosen too, into a draft that has none yet. */
export async function copyEdition(tx: EntityManager, { firmId, from, to }: Copy): Promise<void> {
  const values = { to, firm: firmId, from }
  for (const statement of STATEMENTS) {
    const words: string[] = []
    const text = `${statement} WHERE firm_id = :firm AND edition_id = :from`.replace(
      /:(to|firm|from)\b/g,
      (_, name: keyof typeof values) => {
        words.push(values[name])
        return '?'
      },
    )
    await tx.query(text, words)
  }
}
