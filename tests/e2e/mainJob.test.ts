import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openBrowser } from '../support/browser'
import { startProduct, type Product } from '../support/product'

/** The whole job once through, as somebody who has never seen the product: one floor both ways, priced, compared, e-mailed. */
let product: Product
let browser: Browser
let page: Page
const complaints: string[] = []
/** Blocks drawn on the plan of each level, as last counted. */
const drawnBlocks: Record<string, number> = {}

beforeAll(async () => {
  product = await startProduct()
  browser = await openBrowser()
  page = await (await browser.newContext({ viewport: { width: 1440, height: 1400 } })).newPage()
  page.setDefaultTimeout(60_000)
  page.on('pageerror', (error) => complaints.push(error.message))
  page.on('console', (message) => {
    if (message.type() === 'error' && !message.text().includes('401')) complaints.push(message.text())
  })
})
afterAll(async () => {
  await browser?.close()
  await product?.stop()
})

const grid = (level: string) => page.getByRole('grid', { name: `Panels of ${level}` })
const totals = () => page.getByRole('status', { name: 'Both totals' })

/** Both totals as the strip shows them at this moment; NaN while there is none. */
async function totalsNow(): Promise<readonly number[]> {
  const texts = await totals().locator('dd').allInnerTexts()
  return texts.slice(0, 2).map((text) => Number(/\d[\d,]*/.exec(text)?.[0].replaceAll(',', '') ?? NaN))
}

/** Both totals, once they stand. */
async function readTotals(): Promise<readonly number[]> {
  await expect.poll(async () => (await totalsNow()).filter(Number.isFinite).length).toBe(2)
  return await totalsNow()
}

async function typeInto(level: string, cell: string, text: string): Promise<void> {
  const field = grid(level).getByLabel(cell, { exact: true })
  await field.fill(text)
  await field.press('Tab')
}

/** Blocks drawn on the plan, and the sum of the table's last row, at this moment. */
async function drawnAndCounted(level: string): Promise<readonly [drawn: number, counted: number]> {
  const drawn = await page
    .getByRole('img', { name: new RegExp(`^Plan of ${level},`) })
    .locator('.block')
    .count()
  const counted = await grid(level).locator('tfoot td').last().innerText()
  drawnBlocks[level] = drawn
  return [drawn, Number(counted.replaceAll(',', ''))]
}

/** Number of blocks, once the plan shows as many as the table. */
async function settledBlocks(level: string): Promise<number> {
  const differenceNow = async () => {
    const [drawn, counted] = await drawnAndCounted(level)
    return drawn > 0 ? drawn - counted : NaN
  }
  await expect.poll(differenceNow).toBe(0)
  return drawnBlocks[level]!
}

describe('the main job', () => {
  it('signs in as the demo surveyor and opens Tarn Court', async () => {
    await page.goto(product.address)
    await page.getByLabel('E-mail').fill('surveyor@example.test')
    await page.getByLabel('Password').fill(product.passwords.get('surveyor@example.test')!)
    await page.getByRole('button', { name: 'Sign in' }).click()
    await page
      .getByRole('link', { name: /Tarn Court/ })
      .first()
      .click()
    await page.getByRole('link', { name: /Levels$/ }).click()
    await totals().waitFor()
  })

  it('draws on the plan as many blocks as the bill counts', async () => {
    expect(await settledBlocks('L1')).toBeGreaterThan(1000)
  })

  it('moves both totals when a span changes', async () => {
    const before = await readTotals()
    await typeInto('L1', 'P1 along x, mm', '7200')
    await expect.poll(async () => (await totalsNow()).every((total, i) => total > before[i]!)).toBe(true)
    await settledBlocks('L1')
  })

  it('says what is wrong with a panel too small, keeps what was typed, and undoes it', async () => {
    const counted = await settledBlocks('L1')
    await typeInto('L1', 'P1 along y, mm', 'six metres')
    await expect.poll(() => grid('L1').innerText()).toContain('expected')
    expect(await grid('L1').getByLabel('P1 along y, mm', { exact: true }).inputValue()).toBe('six metres')
    await grid('L1').getByLabel('P1 along y, mm', { exact: true }).press('Escape')
    await expect.poll(async () => (await drawnAndCounted('L1'))[1]).toBe(counted)
  })

  it('takes an L-shaped panel drawn on the plan, with a stair void', async () => {
    await page.getByRole('button', { name: 'Add a level' }).click()
    await page.getByRole('button', { name: 'draw an outline' }).click()
    const board = page.getByRole('application')
    const box = (await board.boundingBox())!
    await page.mouse.click(box.x + box.width * 0.2, box.y + box.height * 0.8)
    await page.getByText('1 corner set.').waitFor()
    // each further side by its typed length, towards the pointer
    const sides = [
      [1, 0, '9000'],
      [0, -1, '4500'],
      [-1, 0, '4200'],
      [0, -1, '3000'],
      [-1, 0, '4800'],
    ] as const
    for (const [place, [right, down, length]] of sides.entries()) {
      const from = await lastCorner(board)
      await page.mouse.move(from.x + right * 60, from.y + down * 60)
      await page.keyboard.type(length)
      await page.keyboard.press('Enter')
      await page.getByText(`${place + 2} corners set.`).waitFor()
    }
    await page.keyboard.press('Enter')
    await grid('L2').getByLabel('P1 mark', { exact: true }).waitFor()
    // 9.0 × 7.5 less 4.2 × 3.0
    await expect.poll(() => grid('L2').locator('tfoot').innerText()).toContain('54.90')
    const without = await settledBlocks('L2')
    await typeInto('L2', 'P1 void, mm', '1800 × 1200 at 1500 / 2400')
    await expect.poll(async () => (await drawnAndCounted('L2'))[1]).toBeLessThan(without)
    expect(await settledBlocks('L2')).toBeGreaterThan(0)
  })

  it('opens a quantity to its panels and arithmetic, and shows a bill that adds up', async () => {
    await page.getByRole('link', { name: /Quantities$/ }).click()
    const figure = page.getByRole('button', { name: /^Hollow blocks, whole, ribbed: / })
    await figure.click()
    const parts = page.getByRole('region', { name: /^Parts of Hollow blocks/i })
    await expect.poll(() => parts.innerText()).toMatch(/L2[\s\S]*P1/)
    await page.getByRole('link', { name: /Bill$/ }).click()
    // by its caption: the sheet of quantities stands until the sheet of the bill is loaded
    const bill = page.getByRole('table', { name: /^Bill/ })
    await bill.waitFor()
    const blocks = await bill
      .getByRole('row', { name: /^Hollow blocks, whole/ })
      .locator('td')
      .nth(1)
      .innerText()
    // level L1 is timesed 4
    expect(Number(blocks.replaceAll(',', ''))).toBe(4 * drawnBlocks['L1']! + drawnBlocks['L2']!)
    const cents = async (rows: string) =>
      (await bill.locator(`${rows} td.number:last-child`).allInnerTexts()).map((text) => Number(text.replace(/[^\d]/g, '')))
    const lines = await cents('tbody tr:not(.sum)')
    const [measured, ...rest] = await cents('tfoot tr')
    const markups = rest.slice(0, -2)
    const sum = (amounts: readonly number[]) => amounts.reduce((total, amount) => total + amount, 0)
    expect(lines.length).toBeGreaterThan(8)
    expect(sum(lines)).toBe(measured)
    expect(measured! + sum(markups)).toBe(rest.at(-2))
  })

  it('compares both floors and answers in one sentence', async () => {
    await page.getByRole('link', { name: /Compare$/ }).click()
    await expect
      .poll(() => page.getByRole('heading', { level: 1 }).innerText(), { timeout: 60_000 })
      .toMatch(/costs .* less than/)
  })

  it('sends the comparison, which arrives over SMTP with a PDF', async () => {
    await page.getByRole('link', { name: /Sent$/ }).click()
    await page.getByRole('combobox', { name: 'To' }).click()
    await page.getByRole('option', { name: /Demo client/ }).click()
    await page.getByLabel('A note to go with it').fill('Both floors, as agreed on the telephone.')
    await page.getByRole('button', { name: 'Send the comparison' }).click()
    await expect
      .poll(() => page.getByRole('table', { name: 'Comparisons sent' }).innerText(), { timeout: 60_000 })
      .toMatch(/sent\s+Demo client/)
    await page.goto(`${product.address}/mail`)
    await page
      .getByRole('link', { name: /Tarn Court/ })
      .first()
      .click()
    await expect.poll(() => page.locator('body').innerText()).toContain('client@example.test')
    const [download] = await Promise.all([page.waitForEvent('download'), page.getByRole('link', { name: /\.pdf/ }).click()])
    expect(download.suggestedFilename()).toMatch(/\.pdf$/)
  })

  it('has complained of nothing in the browser', () => {
    expect(complaints).toEqual([])
  })
})

async function lastCorner(board: ReturnType<Page['getByRole']>): Promise<{ x: number; y: number }> {
  const box = (await board.locator('.sketch circle').last().boundingBox())!
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 }
}
