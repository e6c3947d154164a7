import type { ImportField } from '#shared/contracts/rateImport'

/** Words over a column, in the languages that price lists come in; lower case, without accents, points and dashes. */
const WORDS: Readonly<Record<ImportField, readonly string[]>> = {
  code: [
    ...['code', 'item', 'item code', 'item no', 'article', 'article no', 'art no', 'article number', 'part no', 'product code'],
    ...[
      'ref no',
      'resource',
      'resource code',
      'no',
      'artikelnummer',
      'artikelnr',
      'artikel nr',
      'art nr',
      'artnr',
      'reference article',
    ],
    ...['referenz', 'codigo', 'codice', 'artikel', 'ordering code', 'stock code'],
  ],
  kind: ['kind', 'type', 'category', 'art', 'typ', 'tipo'],
  description: [
    ...['description', 'name', 'designation', 'product', 'material', 'text', 'bezeichnung', 'beschreibung', 'benennung'],
    ...['libelle', 'descripcion', 'descrizione', 'descricao', 'article description', 'item description'],
  ],
  unit: [
    'unit',
    'units',
    'uom',
    'unit of measure',
    'per',
    'einheit',
    'me',
    'unite',
    'unidad',
    'unita',
    'unidade',
    'mengeneinheit',
  ],
  low: ['low', 'lowest', 'min', 'minimum', 'from', 'low price', 'low rate'],
  likely: [
    ...['likely', 'price', 'unit price', 'rate', 'cost', 'net price', 'list price', 'likely price', 'price each', 'unit rate'],
    ...[
      'preis',
      'einzelpreis',
      'einheitspreis',
      'listenpreis',
      'nettopreis',
      'prix',
      'prix unitaire',
      'precio',
      'prezzo',
      'preco',
    ],
  ],
  high: ['high', 'highest', 'max', 'maximum', 'to', 'high price', 'high rate'],
  supplier: ['supplier', 'vendor', 'merchant', 'lieferant', 'fournisseur', 'proveedor', 'fornitore', 'fornecedor'],
  reference: [
    'reference',
    'quotation',
    'quote',
    'quotation no',
    'quote no',
    'quotation ref',
    'angebot',
    'angebotsnummer',
    'offre',
  ],
  contains: [
    'contains',
    'pack',
    'pack size',
    'per pack',
    'content',
    'contents',
    'units in it',
    'inhalt',
    'gebinde',
    'conditionnement',
  ],
  day: ['day', 'date', 'quoted on', 'quotation date', 'date of quotation', 'datum', 'fecha', 'data'],
  validUntil: ['valid until', 'valid to', 'holds until', 'expires', 'gultig bis', 'valable jusqu au'],
  source: ['source', 'from list', 'quelle'],
  sourceDate: ['source date', 'date of source', 'price date', 'priced on', 'preisstand'],
}

const plain = (text: string): string =>
  text
    .normalize('NFD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/\([^)]*\)|\[[^\]]*\]/g, ' ')
    .replace(/\b(eur|usd|gbp|chf|euro)\b|[€$£¥]/g, ' ')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()

const FIELDS = new Map(
  (Object.keys(WORDS) as ImportField[]).flatMap((field) => WORDS[field].map((word) => [word, field] as const)),
)

/** The field that a head names, apart from case, accents, brackets, currency and marks; null where it names none. */
export function fieldOfHead(head: string): ImportField | null {
  if (head.length > 60) return null
  return FIELDS.get(plain(head)) ?? FIELDS.get(plain(head).replace(/ (per unit|in|excl vat|ex vat|net)$/, '')) ?? null
}
