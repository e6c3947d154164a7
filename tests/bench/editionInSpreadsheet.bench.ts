/**
 * Whether a spreadsheet works out of an exported workbook what we do: every value beside a formula is taken away, a spreadsheet program
 * works them out anew, and each must be the one that was there. Needs `soffice` (Debian: libreoffice-calc).
 * Run: `npx tsx tests/bench/editionInSpreadsheet.bench.ts`.
 */
import ExcelJS from 'exceljs'
import { execFileSync } from 'node:child_process'
import { createWriteStream, mkdtempSync, rmSync } from 'node:fs'
import { finished } from 'node:stream/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { buildUp } from '#shared/contracts/buildUp'
import { builtUpRate } from '#shared/pricing/builtUpRate'
import { editionSheets } from '../../server/services/editionExport/editionSheets'
import type { ExportedEdition } from '../../server/services/editionExport/exportedEdition'
import { writeWorkbook } from '../../server/services/editionExport/writeWorkbook'

const price = (likely: number) => ({ low: (likely * 0.9).toFixed(2), likely: likely.toFixed(2), high: (likely * 1.2).toFixed(2) })
const own = { source: 'Price list', sourceDate: '2026-08-01', hasChosenQuotation: false, version: 1 }
const resources = [
  { ...own, code: 'block', kind: 'material' as const, description: '=1+1', unit: 'nr', price: price(0.83) },
  { ...own, code: 'fixer', kind: 'labour' as const, description: 'Fixer', unit: 'h', price: price(7.35) },
  { ...own, code: 'pump', kind: 'plant' as const, description: 'Pump', unit: 'h', price: price(61.7) },
  { ...own, code: 'fuel', kind: 'material' as const, description: 'Fuel', unit: 'l', price: price(1.37) },
]
const gangs = [
  { code: 'gang', description: 'Two fixers', members: [{ resource: 'fixer', count: '2' }, { resource: 'fixer', count: '0.25' }], version: 1 },
] // prettier-ignore
const prices = {
  resources: new Map(resources.map((row) => [row.code, row])),
  gangs: new Map(gangs.map((row) => [row.code, row])),
}

const rates = Array.from({ length: 20 }, (_, index) => {
  const built = buildUp.parse({
    materials: [
      { resource: 'block', quantity: (3 + index / 7).toFixed(6), wastePercent: String(index / 2), uses: 1 + (index % 5) },
    ],
    labour: [{ gang: 'gang', basis: index % 2 === 0 ? 'hours' : 'output', value: (0.3 + index / 10).toFixed(1) }],
    plant: [
      { resource: 'pump', fuel: index % 3 === 0 ? null : { resource: 'fuel', perHour: '4.5' }, outputPerHour: String(6 + index) },
    ],
    overheadsPercent: '7.5',
    profitPercent: String(index / 4),
  })
  const three = builtUpRate(built, prices, 'USD').price
  const item = `steel.bar.${index}` as never
  return { item, description: 'A rate', unit: 'm', ...three, source: '', sourceDate: null, buildUp: built, version: 1 }
})

const facts = {
  id: '',
  bookId: '',
  region: 'Eastmere',
  currency: 'USD',
  number: 1,
  state: 'draft' as const,
  baseDate: '2026-10-01',
}
const life = {
  validUntil: null,
  compiledBy: 'E',
  checkedBy: null,
  taxBasis: 'without',
  note: '',
  holdsOverheads: true,
  reason: '',
}
const edition = { ...facts, ...life, corrects: null, stateReason: '', isOwnWork: true, version: 1, rates, blockRates: [] }
const exported: ExportedEdition = { edition, resources, gangs, quotations: [] }

type Formula = { readonly place: string; readonly value: number }
function formulasOf(book: ExcelJS.Workbook): Formula[] {
  const found: Formula[] = []
  for (const sheet of book.worksheets) {
    sheet.eachRow((row) =>
      row.eachCell((cell) => {
        if (cell.type === ExcelJS.ValueType.Formula)
          found.push({ place: `${sheet.name}!${cell.address}`, value: Number(cell.result) })
      }),
    )
  }
  return found
}

const folder = mkdtempSync(join(tmpdir(), 'bothways-spreadsheet-'))
try {
  const stream = createWriteStream(join(folder, 'ours.xlsx'))
  await writeWorkbook(editionSheets(exported), stream)
  await finished(stream)
  const book = new ExcelJS.Workbook()
  await book.xlsx.readFile(join(folder, 'ours.xlsx'))
  const ours = formulasOf(book)
  for (const sheet of book.worksheets) {
    sheet.eachRow((row) =>
      row.eachCell((cell) => {
        if (cell.type === ExcelJS.ValueType.Formula) cell.value = { formula: cell.formula, date1904: false }
      }),
    )
  }
  await book.xlsx.writeFile(join(folder, 'bare.xlsx'))
  const profile = `-env:UserInstallation=file://${join(folder, 'profile')}`
  const out = join(folder, 'out')
  execFileSync('soffice', [profile, '--headless', '--convert-to', 'xlsx', '--outdir', out, join(folder, 'bare.xlsx')], {
    stdio: 'ignore',
  })
  const theirs = new ExcelJS.Workbook()
  await theirs.xlsx.readFile(join(out, 'bare.xlsx'))
  const worked = new Map(formulasOf(theirs).map(({ place, value }) => [place, value]))
  const differing = ours.filter(({ place, value }) => !(Math.abs((worked.get(place) ?? NaN) - value) < 1e-9 * Math.max(1, value)))
  process.stdout.write(`${ours.length} formulas, ${differing.length} differ ${JSON.stringify(differing.slice(0, 5))}\n`)
  process.exitCode = differing.length === 0 && ours.length > 0 ? 0 : 1
} finally {
  rmSync(folder, { recursive: true, force: true })
}
