import type { CalculationEntry, CalculationLine, CalculationSection, PanelCalculation } from '#shared/calculation/calculation'
import { expressionInWords } from '#shared/takeoff/expressionInWords'
import { CHECK_NAMES } from './content/checkNames'
import type { ReportContent } from './content/reportContent'
import { figureText } from './figureText'
import { markup, type Markup } from './markup'
import { factList } from './reportSections'

function lineMarkup({ symbol, formula, numbers, result, note }: CalculationLine): Markup {
  const parts = [symbol, formula, numbers, result].filter((part) => part !== null).map(expressionInWords)
  return markup`<p>${parts.join(' = ')}${note === null ? '' : ` (${expressionInWords(note)})`}</p>`
}

function verdict({ check }: CalculationEntry): string {
  if (check === null) return ''
  return `${figureText(check.utilisation, 2)} ${check.pass ? 'passes' : 'fails'}`
}

function entryRow(entry: CalculationEntry): Markup {
  const { heading, clause, lines, check } = entry
  const name = check === null ? `${heading.charAt(0).toUpperCase()}${heading.slice(1)}` : `${CHECK_NAMES[check.name]}: ${heading}`
  return markup`<tr class="${check === null || check.pass ? 'passes' : 'fails'}">
    <th scope="row">${name}<span class="remark-line">${clause}</span></th>
    <td class="lines">${lines.map(lineMarkup)}</td>
    <td class="used">${verdict(entry)}</td>
  </tr>`
}

function step({ title, entries }: CalculationSection, at: number): Markup {
  return markup`<tbody>
    <tr class="group"><th scope="rowgroup" colspan="3">${at + 1}. ${title}</th></tr>
    ${entries.map(entryRow)}
  </tbody>`
}

function calculation({ kind, scheme, level, panel, basis, inputs, assumptions, sections }: PanelCalculation): Markup {
  const facts = [
    { title: 'Given', text: inputs.map(({ name, value }) => `${name} ${value}`).join('; ') },
    { title: 'Assumed', text: assumptions.join('; ') },
  ].filter(({ text }) => text !== '')
  return markup`<section class="calculation small-facts">
    <h2>Calculation of ${level}, ${panel}: <span class="${kind}">${kind}, ${scheme}</span></h2>
    <p class="small">The panel with the tightest check of this scheme, by ${basis}. ${
      kind === 'ribbed' ? 'Moments and steel for one rib.' : 'Moments and steel for one metre.'
    } Preliminary, to be confirmed by the engineer.</p>
    ${factList(facts)}
    <table>
      <thead>
        <tr>
          <th scope="col">What and where</th>
          <th scope="col">Formula, numbers, result</th>
          <th scope="col" class="used">Used</th>
        </tr>
      </thead>
      ${sections.map(step)}
    </table>
  </section>`
}

/** How the tightest panel of each scheme was worked, line by line; nothing for what was sent before it was kept. */
export function calculationSections({ calculations }: ReportContent): Markup {
  return markup`${calculations.map(calculation)}`
}
