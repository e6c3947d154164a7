import type { BesideGroup, BesideRow } from './content/besideRows'
import type { ReportContent } from './content/reportContent'
import { markup, type Markup } from './markup'
import { factList } from './reportSections'

function row({ label, unit, ribbed, solid, better, verdict, remark }: BesideRow): Markup {
  const cell = (kind: 'ribbed' | 'solid', text: string) =>
    markup`<td class="number${better === kind ? ' better' : ''}">${text}</td>`
  return markup`<tr>
    <th scope="row">
      ${label} <span class="unit">${unit}</span>
      ${verdict === '' ? '' : markup`<span class="verdict ${better ?? 'even'}">${verdict}</span>`}
      ${remark === '' ? '' : markup`<span class="remark-line">${remark}</span>`}
    </th>
    ${cell('ribbed', ribbed)}${cell('solid', solid)}
  </tr>`
}

function group({ name, rows }: BesideGroup): Markup {
  return markup`<tbody>
    <tr class="group"><th scope="rowgroup" colspan="3">${name}</th></tr>
    ${rows.map(row)}
  </tbody>`
}

/** What is compared beside the cost; nothing for comparisons sent before it was. */
export function besideTable({ beside }: ReportContent): Markup {
  if (beside.length === 0) return markup``
  return markup`<section>
    <h2>Also compared</h2>
    <table class="beside">
      <thead>
        <tr>
          <th scope="col"></th>
          <th scope="col" class="number ribbed">Ribbed</th>
          <th scope="col" class="number solid">Solid</th>
        </tr>
      </thead>
      ${beside.map(group)}
    </table>
    <p class="note">Beside the cost. How each figure came about stands further below.</p>
  </section>`
}

/** Whether both totals hold the same, entry by entry. */
export function scopeSection({ scopeFacts }: ReportContent): Markup {
  if (scopeFacts.length === 0) return markup``
  return markup`<section>
    <h2>Whether both totals hold the same</h2>
    ${factList(scopeFacts)}
  </section>`
}

/** Formulas and sources of what is compared beside the cost. */
export function workingsSection({ besideWorkings }: ReportContent): Markup {
  if (besideWorkings.length === 0) return markup``
  return markup`<section class="small-facts">
    <h2>How the other figures came about</h2>
    ${factList(besideWorkings)}
  </section>`
}
