import { sentenceText, wholeTotal, type Sentence } from '../../reports/content/headline'
import { reportContent, type ReportContent } from '../../reports/content/reportContent'
import type { BesideRow } from '../../reports/content/besideRows'
import type { ComparedFigure } from '../../reports/content/comparedFigures'
import type { ReportFact } from '../../reports/content/reportFact'
import { dayText, decimalText } from '../../reports/figureText'
import type { FrozenComparison } from '../../reports/frozenComparison'
import { markup, type Markup } from '../../reports/markup'
import { comparisonText } from './comparisonText'
import { differenceBarHead, differenceBarRow, totalBars, WORD_COLOUR } from './mailBars'
import { MAIL_COLOURS, MAIL_FONT, mailDocument, mailHeading, mailNote, mailParagraph } from './mailDocument'

/** Subject and both bodies of a mail; the bodies say the same. */
export interface MailBodies {
  readonly subject: string
  readonly text: string
  readonly html: string
}

const { ink, inkSecond, hair } = MAIL_COLOURS
const TABLE = markup`role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0"`

function sentence(pieces: Sentence): Markup {
  return markup`${pieces.map(({ text, scheme }) => (scheme ? markup`<span style="color:${WORD_COLOUR[scheme]};">${text}</span>` : text))}`
}

function figureRow({ label, unit, ribbed, solid, better }: ComparedFigure): Markup {
  const cell = (kind: 'ribbed' | 'solid', text: string) => {
    const look = better === kind ? `font-weight:600;color:${ink};` : `font-weight:400;color:${inkSecond};`
    return markup`<td align="right" style="padding:7px 0 7px 12px;border-bottom:1px solid ${hair};${MAIL_FONT}font-size:16px;line-height:22px;${look}white-space:nowrap;">${text}</td>`
  }
  return markup`<tr><th scope="row" align="left" style="padding:7px 0;border-bottom:1px solid ${hair};${MAIL_FONT}font-size:14px;line-height:20px;font-weight:400;color:${ink};text-align:left;">${label} <span style="font-size:13px;color:${inkSecond};">${unit}</span></th>${cell('ribbed', ribbed)}${cell('solid', solid)}</tr>`
}

function figureTable({ figures }: ReportContent): Markup {
  const head = (kind: 'ribbed' | 'solid') =>
    markup`<th scope="col" align="right" style="padding:4px 0 6px 12px;border-bottom:1px solid ${ink};${MAIL_FONT}font-size:14px;line-height:18px;font-weight:600;color:${WORD_COLOUR[kind]};text-align:right;">${kind === 'ribbed' ? 'Ribbed' : 'Solid'}</th>`
  return markup`<table width="100%" cellpadding="0" cellspacing="0" border="0">
<tr><th scope="col" style="border-bottom:1px solid ${ink};font-size:1px;">&nbsp;</th>${head('ribbed')}${head('solid')}</tr>
${figures.map(figureRow)}
</table>`
}

function besideRow({ label, unit, ribbed, solid, better: kind, verdict }: BesideRow): Markup {
  const words = verdict === '' ? unit : `${unit}, ${verdict}`
  return figureRow({ label, unit: words, ribbed, solid, difference: '', better: kind })
}

/** What is compared beside the cost; where the ribbed floor is worse is said below the table. */
function beside({ beside: groups }: ReportContent): Markup {
  const rows = groups.flatMap((group) => group.rows)
  if (rows.length === 0) return markup``
  const remarks = rows.filter(({ better: kind, remark }) => kind === 'solid' && remark !== '').map(({ remark }) => remark)
  return markup`${mailHeading('Also compared')}<table width="100%" cellpadding="0" cellspacing="0" border="0">${rows.map(besideRow)}</table>
${remarks.length === 0 ? '' : lines(remarks)}${mailNote('First ribbed, then solid. How each figure came about stands in the attached PDF.')}`
}

function factRows(facts: readonly ReportFact[]): Markup {
  return markup`<table ${TABLE}>${facts.map(
    ({ title, text }) =>
      markup`<tr><td style="padding:7px 0;border-bottom:1px solid ${hair};${MAIL_FONT}font-size:14px;line-height:20px;color:${ink};"><strong style="font-weight:600;">${title}.</strong> ${text}</td></tr>`,
  )}</table>`
}

function better(heading: string, facts: readonly ReportFact[]): Markup {
  return facts.length === 0 ? markup`` : markup`${mailHeading(heading)}${factRows(facts)}`
}

function lines(texts: readonly string[]): Markup {
  return markup`<table ${TABLE}>${texts.map(
    (text) =>
      markup`<tr><td style="padding:7px 0;border-bottom:1px solid ${hair};${MAIL_FONT}font-size:14px;line-height:20px;color:${ink};">${text}</td></tr>`,
  )}</table>`
}

function differences(content: ReportContent): Markup {
  return markup`${mailHeading('Where the difference comes from')}
<table ${TABLE}>${differenceBarHead()}${content.bars.map(differenceBarRow)}
<tr><td style="padding:8px 0;border-bottom:3px double ${ink};${MAIL_FONT}font-size:14px;line-height:20px;font-weight:600;">Ribbed less solid, ${content.currency}</td><td align="right" style="padding:8px 0;border-bottom:3px double ${ink};${MAIL_FONT}font-size:14px;line-height:20px;font-weight:600;white-space:nowrap;">${content.totalDifference}</td></tr>
</table>
${content.turning.length === 0 ? '' : markup`${mailHeading('What would turn it')}${lines(content.turning)}`}`
}

function opening(frozen: FrozenComparison, content: ReportContent): Markup {
  const { firm, project } = frozen
  const place = project.place === '' ? project.name : `${project.name}, ${project.place}`
  return markup`<p style="margin:0;padding:0 0 12px;border-bottom:1px solid ${ink};${MAIL_FONT}font-size:16px;line-height:22px;font-weight:600;color:${ink};">${firm.name}${firm.isDemo ? markup` <span style="font-size:13px;font-weight:400;color:${inkSecond};">demo data</span>` : ''}</p>
${mailNote(`${place}. For ${frozen.recipient.name}, ${dayText(frozen.frozenAt)}.`)}
<h1 style="margin:12px 0 0;${MAIL_FONT}font-size:28px;line-height:34px;font-weight:300;color:${ink};">${sentence(content.headline)}</h1>
<p style="margin:12px 0 0;${MAIL_FONT}font-size:17px;line-height:26px;color:${ink};">${content.standfirst}</p>
${content.scopeCaution === '' ? '' : markup`<p style="margin:12px 0 0;padding:8px 0;border-top:1px solid ${ink};border-bottom:1px solid ${ink};${MAIL_FONT}font-size:14px;line-height:20px;color:${ink};">${content.scopeCaution}</p>`}
${content.note === '' ? '' : content.note.split(/\n+/).map(mailParagraph)}`
}

function body(frozen: FrozenComparison, content: ReportContent): Markup {
  const total = (kind: 'ribbed' | 'solid') => {
    const amount = wholeTotal(frozen, kind)
    return { amount, text: `${decimalText(amount.toFixed())} ${content.currency}` }
  }
  return markup`${opening(frozen, content)}
${mailHeading('What each makes')}
${totalBars({ ribbed: total('ribbed'), solid: total('solid') })}
<div style="font-size:1px;line-height:16px;">&nbsp;</div>
${figureTable(content)}
${mailNote('The lesser figure is set heavier. Dead load is concrete and blocks only. Both floors are drawn in the attached PDF.')}
${differences(content)}
${beside(content)}
${better('Whether both totals hold the same', content.scopeFacts)}
${better('Where solid is better', content.better.solid)}
${better('Where ribbed is better', content.better.ribbed)}
${mailHeading('What stands behind it')}${factRows(content.basis)}
${mailHeading('What is left out')}${lines(content.leftOut)}
${mailHeading('Checks')}${lines(content.checked.map(({ kind, mark, summary }) => `${kind === 'ribbed' ? 'Ribbed' : 'Solid'}, ${mark}: ${summary.replace(/[:;].*$/, '')}. The PDF lists them.`))}
${mailHeading('Before anyone builds')}${lines(content.cautions)}
${mailNote(content.titleBlock.map(({ title, text }) => `${title}: ${text}`).join('. '))}`
}

/** The mail that brings a comparison: the answer first, the same figures as in the report, the PDF goes with it. */
export function comparisonMail(frozen: FrozenComparison): MailBodies {
  const content = reportContent(frozen)
  const answer = sentenceText(content.headline)
  return {
    subject: `${frozen.project.name}, ${frozen.project.reference}: the floor built both ways`,
    text: comparisonText(frozen, content),
    html: mailDocument(content.title, answer, body(frozen, content)),
  }
}
