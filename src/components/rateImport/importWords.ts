import type { ImportField, ImportRowState, ImportTarget, RateImport } from '#shared/contracts/rateImport'

/** What rows may become, in words of the trade. */
export const TARGETS: readonly { value: ImportTarget; label: string; note: string }[] = [
  { value: 'resources', label: 'Resources', note: 'materials, labour, plant' },
  { value: 'quotations', label: 'Quotations', note: 'a supplier’s list' },
  { value: 'rates', label: 'Rates', note: 'by item of the bill' },
]

/** Fields that each target knows, needed ones first. */
export const FIELDS: Readonly<Record<ImportTarget, readonly { field: ImportField; label: string; isNeeded?: true }[]>> = {
  resources: [
    { field: 'code', label: 'Code', isNeeded: true },
    { field: 'likely', label: 'Price, likely', isNeeded: true },
    { field: 'description', label: 'Description' },
    { field: 'unit', label: 'Unit' },
    { field: 'kind', label: 'Kind' },
    { field: 'low', label: 'Price, low' },
    { field: 'high', label: 'Price, high' },
    { field: 'source', label: 'Source' },
    { field: 'sourceDate', label: 'Date of the source' },
  ],
  quotations: [
    { field: 'code', label: 'Code', isNeeded: true },
    { field: 'likely', label: 'Price of the pack', isNeeded: true },
    { field: 'contains', label: 'Units in a pack' },
    { field: 'description', label: 'Description' },
    { field: 'unit', label: 'Unit' },
    { field: 'kind', label: 'Kind' },
    { field: 'supplier', label: 'Supplier' },
    { field: 'reference', label: 'Reference' },
    { field: 'day', label: 'Day quoted' },
    { field: 'validUntil', label: 'Holds until' },
  ],
  rates: [
    { field: 'code', label: 'Item', isNeeded: true },
    { field: 'likely', label: 'Rate, likely', isNeeded: true },
    { field: 'description', label: 'Description' },
    { field: 'unit', label: 'Unit' },
    { field: 'low', label: 'Rate, low' },
    { field: 'high', label: 'Rate, high' },
    { field: 'source', label: 'Source' },
    { field: 'sourceDate', label: 'Date of the source' },
  ],
}

export const STATES: readonly { value: ImportRowState; label: string }[] = [
  { value: 'refused', label: 'refused' },
  { value: 'new', label: 'new' },
  { value: 'changed', label: 'changed' },
  { value: 'unchanged', label: 'unchanged' },
]

/** Where an import stands, for a list of earlier ones. */
export const STATE_IN_WORDS: Readonly<Record<RateImport['state'], string>> = {
  reading: 'being read',
  matching: 'columns to be matched',
  checking: 'being checked',
  previewed: 'checked, not put in',
  committing: 'being put in',
  committed: 'put in',
  undone: 'undone',
  failed: 'not read',
}
