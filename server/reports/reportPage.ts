import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { svgText } from '#shared/drawing/svgText'
import { reportContent, type ReportContent } from './content/reportContent'
import type { ReportFact } from './content/reportFact'
import { besideTable, scopeSection, workingsSection } from './besideSections'
import { calculationSections } from './calculationSection'
import { barHatches } from './differenceBar'
import { dayText } from './figureText'
import type { FrozenComparison } from './frozenComparison'
import { markup, type Markup, trustedMarkup } from './markup'
import { embeddedFonts } from './reportFonts'
import { checkTable, differenceTable, factList, figureTable, plainList, sentenceMarkup, titleBlockMarkup } from './reportSections'

/** The report as one document that needs nothing from outside. `styleHash`: its style sheet's, for a content security policy. */
export interface ReportPage {
  readonly document: string
  readonly styleHash: string
}

/** In the order of the cascade. */
const STYLE = ['report.css', 'reportTables.css', 'reportBeside.css', 'reportCalculation.css', 'reportMedia.css']
  .map((file) => readFileSync(new URL(file, import.meta.url), 'utf8'))
  .join('\n')
const CAUTION_SIGN = trustedMarkup(
  '<svg width="18" height="18" viewBox="0 0 18 18" aria-hidden="true"><path d="M9 2L17 16H1Z" fill="none" stroke="#1e2930" stroke-width="1.4"/><path d="M9 7v4M9 12.6v1.4" stroke="#1e2930" stroke-width="1.4"/></svg>',
)

/** Any text as a string of a style sheet: whatever is not a letter, a digit or a space is written by its number. */
function styleString(text: string): string {
  const escaped = [...text].map((character) =>
    /[A-Za-z0-9 ]/.test(character) ? character : `\\${character.codePointAt(0)!.toString(16)} `,
  )
  return `"${escaped.join('')}"`
}

function pageStyle({ project }: FrozenComparison, text: string): string {
  const foot = `@page{@bottom-center{content:${styleString(`${project.name}, ${project.reference}. Page `)} counter(page) " of " counter(pages)}}`
  return `${embeddedFonts(text)}\n${STYLE}\n${foot}`
}

function opening(frozen: FrozenComparison, content: ReportContent): Markup {
  const { project, recipient, firm } = frozen
  const place = project.place === '' ? project.name : `${project.name}, ${project.place}`
  return markup`<header class="head">
      <p class="firm">${firm.name}</p>
      <p>${firm.isDemo ? 'Demo data' : ''}</p>
    </header>
    <div class="opening">
      <p class="to">${place}. For ${recipient.name}, ${dayText(frozen.frozenAt)}.</p>
      <h1>${sentenceMarkup(content.headline)}</h1>
      <p class="standfirst">${content.standfirst}</p>
      ${content.scopeCaution === '' ? '' : markup`<p class="unequal">${content.scopeCaution}</p>`}
      ${content.note === '' ? '' : markup`<p class="remark">${content.note}</p>`}
    </div>`
}

function drawings({ sections }: FrozenComparison): Markup {
  return markup`<section class="no-break">
    <h2>The two floors</h2>
    <div class="wide-drawing">${trustedMarkup(svgText(sections.wide))}</div>
    <div class="narrow-drawing">${trustedMarkup(svgText(sections.narrow))}</div>
    <p class="note">Cross-sections at midspan, at one scale on one soffit line, drawn from the sizes that were priced. Millimetres.</p>
  </section>`
}

function differences(content: ReportContent): Markup {
  return markup`<section>
      <h2>Where the difference comes from</h2>
      ${differenceTable(content)}
      <p class="note">Whole ${content.currency}, in groups: single prices stay with the firm.</p>
    </section>
    ${
      content.turning.length === 0
        ? ''
        : markup`<section class="no-break">
            <h2>What would turn it</h2>
            ${plainList(content.turning)}
            <p class="note">One group at a time, with sizes and quantities held as they are.</p>
          </section>`
    }`
}

function better(heading: string, facts: readonly ReportFact[]): Markup {
  if (facts.length === 0) return markup``
  return markup`<section class="no-break">
    <h2>${heading}</h2>
    ${factList(facts)}
  </section>`
}

function behind(content: ReportContent): Markup {
  return markup`${better('Where solid is better', content.better.solid)} ${better('Where ribbed is better', content.better.ribbed)}
    <section>
      <h2>What stands behind it</h2>
      ${factList(content.basis)}
    </section>
    <section class="no-break">
      <h2>What is left out</h2>
      ${plainList(content.leftOut)}
    </section>
    <section>
      <h2>Checks</h2>
      ${content.checked.map(checkTable)}
      <p class="note">Used: demand over capacity; above 1.00 a check fails.</p>
    </section>
    ${workingsSection(content)}`
}

function ending(content: ReportContent): Markup {
  return markup`<section class="no-break">
    <h2>Before anyone builds</h2>
    <div class="cautions">
      ${CAUTION_SIGN}
      <ul>
        ${content.cautions.map((caution) => markup`<li>${caution}</li>`)}
      </ul>
    </div>
    ${titleBlockMarkup(content.titleBlock)}
  </section>`
}

/** The report of a frozen comparison: what the client reads on a page, and what is printed to PDF. */
export function reportPage(frozen: FrozenComparison): ReportPage {
  const content = reportContent(frozen)
  const body = markup`${barHatches()}
    <main>
      ${opening(frozen, content)} ${drawings(frozen)}
      <section class="no-break">
        <h2>What each makes</h2>
        ${figureTable(content)}
      </section>
      ${differences(content)} ${besideTable(content)} ${scopeSection(content)} ${behind(content)} ${ending(content)}
      ${calculationSections(content)}
    </main>`
  const style = pageStyle(frozen, body.text)
  const document = markup`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>${content.title}</title>
        <style>${trustedMarkup(style)}</style>
      </head>
      <body>
        ${body}
      </body>
    </html>`
  return { document: document.text, styleHash: createHash('sha256').update(style).digest('base64') }
}
