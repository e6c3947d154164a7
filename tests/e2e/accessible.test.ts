import AxeBuilder from '@axe-core/playwright'
import type { Browser, BrowserContext, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Role } from '../../shared/contracts/person'
import { sheetsFor } from '../../src/components/project/projectSheets'
import { openBrowser } from '../support/browser'
import { startProduct, type Product } from '../support/product'

/** Every screen, wide and narrow, light and dark. Source: WCAG 2.2, levels A and AA, as far as axe-core can tell; 1.4.10 (reflow). */
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']
/** Colours do not change with the width: the dark paper is looked at once. */
const LOOKS = [
  { width: 1440, papers: ['light', 'dark'] },
  { width: 360, papers: ['light'] },
] as const
type Paper = (typeof LOOKS)[number]['papers'][number]

let product: Product
let browser: Browser
beforeAll(async () => {
  product = await startProduct()
  browser = await openBrowser()
})
afterAll(async () => {
  await browser?.close()
  await product?.stop()
})

/** A browser of its own, signed in as the demo person of this name; absent: nobody. */
async function openAs(name?: string): Promise<BrowserContext> {
  const context = await browser.newContext({ reducedMotion: 'reduce' })
  context.setDefaultTimeout(60_000)
  if (name === undefined) return context
  const email = `${name}@example.test`
  const data = { email, password: product.passwords.get(email)! }
  const answer = await context.request.post(`${product.address}/api/session`, { data })
  expect(answer.status()).toBe(201)
  return context
}

/** Opens the address and waits until everything it asks for has arrived and nothing is being worked out any more. */
async function openScreen(page: Page, path: string): Promise<void> {
  await page.goto(`${product.address}${path}`, { waitUntil: 'networkidle' })
  await page.locator('main :is(h1, h2)').first().waitFor()
  await page.locator('[aria-busy="true"]').waitFor({ state: 'detached' })
}

/** Only colours change with the paper: on the dark one they alone are looked at again. */
async function faultsOf(page: Page, paper: Paper): Promise<string[]> {
  const axe = new AxeBuilder({ page })
  const { violations } = await (paper === 'dark' ? axe.withRules(['color-contrast']) : axe.withTags(RULES)).analyze()
  return violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${id}: ${target.join(' ')} ${failureSummary}`),
  )
}

/** What is wrong with the screen at `path`, in each width and on each paper. */
async function faultsOfScreen(page: Page, path: string): Promise<string[]> {
  const faults: string[] = []
  for (const { width, papers } of LOOKS) {
    await page.setViewportSize({ width, height: 900 })
    await page.emulateMedia({ colorScheme: 'light' })
    await openScreen(page, path)
    const { scrollWidth, clientWidth } = await page.evaluate(() => document.documentElement)
    if (scrollWidth > clientWidth) faults.push(`${path} at ${width} px scrolls sideways: ${scrollWidth} px`)
    for (const colorScheme of papers) {
      await page.emulateMedia({ colorScheme })
      faults.push(...(await faultsOf(page, colorScheme)).map((fault) => `${path} at ${width} px, ${colorScheme}: ${fault}`))
    }
  }
  return faults
}

async function firstProject(context: BrowserContext): Promise<string> {
  const answer = await context.request.get(`${product.address}/api/projects`)
  const projects = (await answer.json()) as { id: string; name: string }[]
  return projects.find(({ name }) => name === 'Tarn Court')!.id
}

async function publishedEdition(context: BrowserContext): Promise<string> {
  const answer = await context.request.get(`${product.address}/api/rate-books`)
  const books = (await answer.json()) as { region: string; editions: { id: string; state: string }[] }[]
  return books.find(({ region }) => region === 'Eastmere')!.editions.find(({ state }) => state === 'published')!.id
}

const sheets = (role: Role) => sheetsFor([role]).map(({ name }) => `/projects/:id/${name}`)
const SCREENS: readonly [who: string, paths: readonly string[]][] = [
  ['nobody', ['/sign-in', '/reset', '/invitation', '/no-such-sheet']],
  ['surveyor', ['/', '/rates', ...sheets('surveyor')]],
  ['estimator', ['/blocks', '/rates', '/rates/:edition/resources']],
  ['developer', ['/', ...sheets('developer')]],
  ['engineer', ['/']],
  ['client', ['/received']],
  ['admin', ['/people']],
]

describe('every screen', () => {
  it.each(SCREENS)(
    'of %s can be read by everybody, wide and narrow, on light and dark paper',
    { timeout: 900_000 },
    async (who, paths) => {
      const context = await openAs(who === 'nobody' ? undefined : who)
      const page = await context.newPage()
      const id = paths.some((path) => path.includes(':id')) ? await firstProject(context) : ''
      const edition = paths.some((path) => path.includes(':edition')) ? await publishedEdition(context) : ''
      for (const path of paths) {
        const address = path.replace(':id', id).replace(':edition', edition)
        expect.soft(await faultsOfScreen(page, address), path).toEqual([])
      }
      await context.close()
    },
  )
})
