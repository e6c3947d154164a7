import type { Check } from '#shared/contracts/appraisalResult'
import { CHECK_NAMES } from './content/checkNames'
import type { ComparedFigure } from './content/comparedFigures'
import type { Sentence } from './content/headline'
import type { CheckedScheme, ReportContent } from './content/reportContent'
import type { ReportFact } from './content/reportFact'
import { differenceBar } from './differenceBar'
import { figureText } from './figureText'
import { markup, type Markup } from './markup'

export function sentenceMarkup(sentence: Sentence): Markup {
  return markup`${sentence.map(({ text, scheme }) => (scheme ? markup`<span class="${scheme}">${text}</span>` : markup`${text}`))}`
}

function figureRow({ label, unit, ribbed, solid, difference, better }: ComparedFigure): Markup {
  const cell = (kind: 'ribbed' | 'solid', text: string) =>
    markup`<td class="number${better === kind ? ' better' : ''}">${text}</td>`
  return markup`<tr>
    <th scope="row">${label} <span class="unit">${unit}</span></th>
    ${cell('ribbed', ribbed)}${cell('solid', solid)}
    <td class="number difference">${difference}</td>
  </tr>`
}

/** The main table: what each scheme costs, weighs and takes. */
export function figureTable({ figures }: ReportContent): Markup {
  return markup`<table class="figures">
      <thead>
        <tr>
          <th scope="col"></th>
          <th scope="col" class="number ribbed">Ribbed</th>
          <th scope="col" class="number solid">Solid</th>
          <th scope="col" class="number difference">Ribbed less solid</th>
        </tr>
      </thead>
      <tbody>
        ${figures.map(figureRow)}
      </tbody>
    </table>
    <p class="note">The lesser figure is set heavier. Dead load is concrete and blocks only.</p>`
}

/** Where the difference in cost comes from, as bars and amounts of groups. */
export function differenceTable({ bars, currency, totalDifference }: ReportContent): Markup {
  return markup`<table>
    <thead>
      <tr>
        <th scope="col"></th>
        <th scope="col" class="bar">
          <span class="who"><span class="ribbed">ribbed cheaper</span><span class="solid">solid cheaper</span></span>
        </th>
        <th scope="col" class="number">${currency}</th>
      </tr>
    </thead>
    <tbody>
      ${bars.map(
        ({ label, amount, share }) =>
          markup`<tr>
            <th scope="row">${label}</th>
            <td class="bar">${differenceBar(share)}</td>
            <td class="number">${amount}</td>
          </tr>`,
      )}
      <tr class="total">
        <th scope="row">Ribbed less solid</th>
        <td></td>
        <td class="number">${totalDifference}</td>
      </tr>
    </tbody>
  </table>`
}

export function factList(facts: readonly ReportFact[]): Markup {
  return markup`<dl class="facts">${facts.map(({ title, text }) => markup`<dt>${title}</dt><dd>${text}</dd>`)}</dl>`
}

export function plainList(texts: readonly string[]): Markup {
  return markup`<ul class="plain">${texts.map((text) => markup`<li>${text}</li>`)}</ul>`
}

function checkRow({ name, clause, level, panel, utilisation, pass }: Check): Markup {
  return markup`<tr class="${pass ? 'passes' : 'fails'}">
    <th scope="row">${CHECK_NAMES[name]}</th>
    <td class="clause">${clause}</td>
    <td>${level}, ${panel}</td>
    <td class="number">${figureText(utilisation, 2)}</td>
    <td>${pass ? 'passes' : 'fails'}</td>
  </tr>`
}

/** Checks of one scheme, with clause and how much of what is allowed is used. */
export function checkTable({ kind, mark, summary, checks }: CheckedScheme): Markup {
  return markup`<div class="scheme-checks">
    <h3 class="${kind}">${kind === 'ribbed' ? 'Ribbed' : 'Solid'}, ${mark}</h3>
    <p class="small">${summary}</p>
    <table>
      <thead>
        <tr>
          <th scope="col">Check</th>
          <th scope="col" class="clause">Clause</th>
          <th scope="col">Level, panel</th>
          <th scope="col" class="number">Used</th>
          <th scope="col">Result</th>
        </tr>
      </thead>
      <tbody>
        ${checks.map(checkRow)}
      </tbody>
    </table>
  </div>`
}

export function titleBlockMarkup(fields: readonly ReportFact[]): Markup {
  return markup`<dl class="title-block">
    ${fields.map(({ title, text }) => markup`<div><dt>${title}</dt><dd>${text}</dd></div>`)}
  </dl>`
}
