import { chromium, type Browser } from 'playwright-core'
import { AppError } from '../errors'

/** Prints pages to PDF, one after the other. */
export interface PdfPrinter {
  /**
   * The page on A4, tagged, with an outline of its headings and its fonts embedded.
   * @param page - a whole document that needs nothing from outside: every request is refused, scripts do not run
   * @throws AppError `limited` when too many wait already, `unavailable` when printing does not end in time
   */
  print(page: string): Promise<Buffer>
  close(): Promise<void>
}

const FLAGS = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]
/** What the browser needs of our surroundings: not the secrets in them. */
const PASSED_ON = ['PATH', 'HOME', 'TMPDIR', 'LANG', 'LC_ALL', 'XDG_CACHE_HOME', 'XDG_CONFIG_HOME', 'FONTCONFIG_FILE']
const MOST_WAITING = 50
const TIME_MS = 30_000

function surroundings(): Record<string, string> {
  return Object.fromEntries(PASSED_ON.flatMap((name) => (process.env[name] === undefined ? [] : [[name, process.env[name]]])))
}

async function printPage(browser: Browser, page: string): Promise<Buffer> {
  const context = await browser.newContext({ javaScriptEnabled: false, offline: true, serviceWorkers: 'block' })
  try {
    context.setDefaultTimeout(TIME_MS)
    await context.route('**/*', (route) => route.abort())
    const sheet = await context.newPage()
    await sheet.setContent(page, { waitUntil: 'load' })
    return await sheet.pdf({ preferCSSPageSize: true, printBackground: true, tagged: true, outline: true })
  } finally {
    await context.close()
  }
}

/**
 * Starts Chromium at the first print and again after it has ended; it ends with us, since it is led through a pipe.
 * @param mostWaiting - pages that may wait or be printed at once
 */
export function createPdfPrinter(chromiumPath: string, mostWaiting: number = MOST_WAITING): PdfPrinter {
  let starting: Promise<Browser> | null = null
  let last: Promise<unknown> = Promise.resolve()
  let waiting = 0

  async function openBrowser(): Promise<Browser> {
    const open = await starting
    if (open?.isConnected()) return open
    starting = chromium.launch({
      executablePath: chromiumPath,
      args: FLAGS,
      env: surroundings(),
      timeout: TIME_MS,
      handleSIGINT: false,
      handleSIGTERM: false,
    })
    return await starting
  }

  async function printOnce(page: string): Promise<Buffer> {
    const browser = await openBrowser().catch((error: unknown) => {
      starting = null
      throw error
    })
    let timer: NodeJS.Timeout | undefined
    const late = new Promise<never>((_, reject) => {
      timer = setTimeout(
        () => reject(new AppError('unavailable', 'The report could not be printed in time. Try again shortly.')),
        TIME_MS,
      )
    })
    try {
      return await Promise.race([printPage(browser, page), late])
    } catch (error) {
      await browser.close()
      throw error
    } finally {
      clearTimeout(timer)
    }
  }

  return {
    async print(page) {
      if (waiting >= mostWaiting)
        throw new AppError('limited', 'Too many reports wait to be printed. Try again shortly.', undefined, 10)
      waiting += 1
      const turn = last.then(() => printOnce(page))
      last = turn.catch(() => undefined)
      try {
        return await turn
      } finally {
        waiting -= 1
      }
    },
    async close() {
      await last
      const open = await starting?.catch(() => null)
      await open?.close()
    },
  }
}
