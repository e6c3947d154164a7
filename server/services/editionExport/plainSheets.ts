import type { ExportedEdition } from './exportedEdition'
import { day, empty, number, text, type ExportedSheet } from './sheetCell'

const PRICED = ['low', 'likely', 'high', 'source', 'source date'] as const

/** Facts of the edition, one a row. */
export function editionSheet({ edition }: ExportedEdition): ExportedSheet {
  const overheads = edition.holdsOverheads ? 'in the rates' : 'added by each project'
  return {
    name: 'edition',
    heads: ['fact', 'value'],
    rows: [
      [text('region'), text(edition.region)],
      [text('edition'), number(String(edition.number))],
      [text('state'), text(edition.state)],
      [text('currency'), text(edition.currency)],
      [text('base date'), day(edition.baseDate)],
      [text('holds until'), day(edition.validUntil)],
      [text('compiled by'), text(edition.compiledBy)],
      [text('checked by'), text(edition.checkedBy ?? '')],
      [text('tax'), text(edition.taxBasis)],
      [text('overheads and profit'), text(overheads)],
      [text('note'), text(edition.note)],
      [text('reason'), text(edition.reason)],
    ],
  }
}

/** Resources in the order of their codes; their prices stand in columns E, F and G. */
export const resourceSheet = ({ resources }: ExportedEdition): ExportedSheet => ({
  name: 'resources',
  heads: ['code', 'kind', 'description', 'unit', ...PRICED],
  rows: resources.map(({ code, kind, description, unit, price, source, sourceDate }) => [
    ...[text(code), text(kind), text(description), text(unit)],
    ...[number(price.low), number(price.likely), number(price.high), text(source), day(sourceDate)],
  ]),
})

/** Quotations in the order of their resources. */
export function quotationSheet({ quotations, resources }: ExportedEdition): ExportedSheet {
  const units = new Map(resources.map(({ code, unit }) => [code, unit]))
  return {
    name: 'quotations',
    heads: ['code', 'supplier', 'unit', 'price', 'contains', 'reference', 'day', 'valid until', 'chosen'],
    rows: quotations.map(({ resource, supplier, price, contains, reference, day: quoted, validUntil, isChosen }) => [
      ...[text(resource), text(supplier), text(units.get(resource) ?? ''), number(price), number(contains)],
      ...[text(reference), day(quoted), day(validUntil), isChosen ? text('chosen') : empty],
    ]),
  }
}
