import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createServer, type Server } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createPdfPrinter, type PdfPrinter } from '../../../server/reports/pdfPrinter'
import { reportPage } from '../../../server/reports/reportPage'
import { frozenExample } from './frozenExample'

const folder = mkdtempSync(join(tmpdir(), 'bothways-pdf-'))
const path = join(folder, 'report.pdf')
let printer: PdfPrinter
let pdf: Buffer
let server: Server
let asked = 0
let address: string

const poppler = (command: string, ...words: string[]) => execFileSync(command, words, { encoding: 'utf8' })

beforeAll(async () => {
  server = createServer((_request, response) => {
    asked += 1
    response.end('x')
  })
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const place = server.address()
  address = `http://127.0.0.1:${typeof place === 'object' && place ? place.port : 0}`
  printer = createPdfPrinter('/usr/bin/chromium')
  pdf = await printer.print(reportPage(frozenExample()).document)
  writeFileSync(path, pdf)
}, 120_000)
afterAll(async () => {
  await printer.close()
  server.close()
  rmSync(folder, { recursive: true })
})

describe('the printed report', { timeout: 120_000 }, () => {
  it('is a tagged PDF on A4 below 2 MB, with the title of the project', () => {
    const about = poppler('pdfinfo', path)
    expect(pdf.length).toBeLessThan(2_000_000)
    expect(about).toMatch(/Tagged:\s+yes/)
    expect(about).toMatch(/Page size:\s+59[45](\.\d+)? x 84[12](\.\d+)? pts \(A4\)/)
    expect(about).toMatch(/Title:\s+Tarn Court: the floor built both ways/)
    expect(about).toMatch(/JavaScript:\s+no/)
  })

  it('has real headings and tables', () => {
    const structure = poppler('pdfinfo', '-struct-text', path)
    expect(structure.match(/^\s*H1/gm)).toHaveLength(1)
    expect(structure.match(/^\s*H2/gm)).toHaveLength(9)
    expect(structure.match(/^\s*Table/gm)!.length).toBeGreaterThanOrEqual(4)
    expect(structure.match(/^\s*TH/gm)!.length).toBeGreaterThan(10)
  })

  it('embeds every font, Source Sans 3 among them', () => {
    const rows = poppler('pdffonts', path).trim().split('\n').slice(2)
    expect(rows.length).toBeGreaterThan(1)
    expect(rows.join('\n')).toContain('SourceSans3')
    for (const row of rows) expect(row).toMatch(/ yes (yes|no) +(yes|no) +\d+ +\d+$/)
  })

  it('says what the page says, figure for figure, with page numbers', () => {
    const text = poppler('pdftotext', '-layout', path, '-').replace(/\s+/g, ' ')
    for (const words of [
      'Ribbed costs 4,105 USD less than solid and weighs 18% less.',
      'Cost of all floors USD 80,030 84,135 −4,105',
      'Dead load kN/m² 4.09 5.00 −0.91',
      'Concrete, bars and mesh −10,960',
      'Ribbed less solid −4,105',
      'Preliminary sizes for comparing costs; not a design.',
      'Tarn Court, TC-06. Page 1 of 3',
      'Page 3 of 3',
    ]) {
      expect(text).toContain(words)
    }
  })

  it('draws both floors as lines, not as pictures', () => {
    const images = poppler('pdfimages', '-list', path).trim().split('\n').slice(2)
    expect(images.filter((row) => !/ (smask|stencil|mask) /.test(row))).toEqual([])
    const svg = join(folder, 'page.svg')
    poppler('pdftocairo', '-svg', '-f', '1', '-l', '1', path, svg)
    const drawn = execFileSync('grep', ['-c', '<path', svg], { encoding: 'utf8' })
    expect(Number(drawn)).toBeGreaterThan(100)
    const text = poppler('pdftotext', '-f', '1', '-l', '1', path, '-')
    for (const words of ['R1 Ribbed', 'S1 Solid', 'common soffit', '500']) expect(text).toContain(words)
  })
})

describe('the printer', { timeout: 120_000 }, () => {
  it('asks nobody for anything and runs no script', async () => {
    const page = `<!doctype html><html lang="en"><head><title>quiet</title><link rel="stylesheet" href="${address}/a.css">
      <style>@import url(${address}/b.css); body { background: url(${address}/c.png) }</style></head>
      <body><h1>before</h1><img src="${address}/d.png"><iframe src="${address}/e"></iframe><iframe src="file:///etc/passwd"></iframe>
      <script>document.querySelector('h1').textContent = 'after'; fetch('${address}/f')</script></body></html>`
    writeFileSync(path, await printer.print(page))
    const text = poppler('pdftotext', path, '-')
    expect(text).toContain('before')
    expect(text).not.toMatch(/after|root:/)
    expect(asked).toBe(0)
  })

  it('prints one page after the other, each its own', async () => {
    const pages = await Promise.all(
      Array.from({ length: 6 }, (_, index) => printer.print(`<!doctype html><title>n${index}</title><h1>number ${index}</h1>`)),
    )
    pages.forEach((page, index) => {
      writeFileSync(path, page)
      expect(poppler('pdftotext', path, '-')).toContain(`number ${index}`)
    })
  })

  it('says no when too many wait, and goes on with those that wait', async () => {
    const small = createPdfPrinter('/usr/bin/chromium', 3)
    const answers = await Promise.allSettled(Array.from({ length: 5 }, () => small.print('<!doctype html><title>q</title>x')))
    await small.close()
    const codes = answers.map((answer) => (answer.status === 'rejected' ? (answer.reason as { code: string }).code : 'printed'))
    expect(codes).toEqual(['printed', 'printed', 'printed', 'limited', 'limited'])
  })

  it('gives the browser none of the secrets in our surroundings', async () => {
    const [seen, script] = [join(folder, 'seen.txt'), join(folder, 'chromium.sh')]
    writeFileSync(script, `#!/bin/sh\nenv > '${seen}'\nexec /usr/bin/chromium "$@"\n`, { mode: 0o700 })
    process.env['SESSION_SECRET'] = 'never to be passed on'
    const wrapped = createPdfPrinter(script)
    await wrapped.print('<!doctype html><title>q</title>x')
    await wrapped.close()
    delete process.env['SESSION_SECRET']
    const names = readFileSync(seen, 'utf8')
      .split('\n')
      .map((text) => text.split('=')[0])
    expect(names).toContain('PATH')
    expect(names.filter((name) => /SECRET|DATABASE|SMTP|VITEST/.test(name!))).toEqual([])
  })

  it('fails without a browser, and says so instead of hanging', async () => {
    const without = createPdfPrinter('/nonexistent/chromium')
    await expect(without.print('<!doctype html>x')).rejects.toThrow(/chromium|ENOENT|executable/i)
    await without.close()
  })
})
