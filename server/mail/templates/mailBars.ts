import { Decimal } from '#shared/pricing/decimal'
import type { SchemeKind } from '../../reports/content/headline'
import type { DifferenceBar } from '../../reports/content/reportContent'
import { markup, type Markup } from '../../reports/markup'
import { MAIL_COLOURS, MAIL_FONT } from './mailDocument'

const { clay, clayInk, slate, ink, inkSecond, hair } = MAIL_COLOURS
const COLOUR: Record<SchemeKind, string> = { ribbed: clay, solid: slate }
export const WORD_COLOUR: Record<SchemeKind, string> = { ribbed: clayInk, solid: slate }

/** A filled cell: ribbed within a dashed line, solid within a full one, so that colour is not all that tells them apart. */
function filled(kind: SchemeKind, percent: number): Markup {
  const width = Math.max(1, Math.round(percent))
  const line = kind === 'ribbed' ? 'dashed' : 'solid'
  return markup`<td width="${width}%" bgcolor="${COLOUR[kind]}" style="width:${width}%;height:14px;line-height:14px;font-size:1px;background:${COLOUR[kind]};border:1px ${line} ${ink};">&nbsp;</td>`
}

function empty(percent: number): Markup {
  return percent < 1 ? markup`` : markup`<td width="${Math.round(percent)}%" style="font-size:1px;line-height:14px;">&nbsp;</td>`
}

function track(cells: Markup): Markup {
  return markup`<table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0" style="table-layout:fixed;"><tr>${cells}</tr></table>`
}

/** Both totals as bars from zero, one under the other, each named and with its figure. */
export function totalBars(totals: Readonly<Record<SchemeKind, { amount: Decimal; text: string }>>): Markup {
  const most = Decimal.max(totals.ribbed.amount, totals.solid.amount, 1)
  return markup`<table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0">
${(['ribbed', 'solid'] as const).map((kind) => {
  const percent = totals[kind].amount.times(100).div(most).toNumber()
  return markup`<tr><td style="padding:8px 0 2px;${MAIL_FONT}font-size:14px;line-height:20px;color:${WORD_COLOUR[kind]};font-weight:600;">${kind === 'ribbed' ? 'Ribbed' : 'Solid'}</td>
<td align="right" style="padding:8px 0 2px;${MAIL_FONT}font-size:18px;line-height:22px;color:${ink};white-space:nowrap;">${totals[kind].text}</td></tr>
<tr><td colspan="2">${track(markup`${filled(kind, percent)}${empty(100 - percent)}`)}</td></tr>`
})}
</table>`
}

/** One difference as a bar from the middle: to the left where ribbed is the cheaper there, to the right where solid is. */
export function differenceBarRow({ label, amount, share }: DifferenceBar): Markup {
  const length = Math.abs(share) * 50
  const middle = markup`<td width="2" style="width:2px;font-size:1px;line-height:14px;background:${ink};" bgcolor="${ink}">&nbsp;</td>`
  const left = share < 0 ? markup`${empty(50 - length)}${filled('ribbed', length)}` : empty(50)
  const right = share > 0 ? markup`${filled('solid', length)}${empty(50 - length)}` : empty(50)
  return markup`<tr><td style="padding:8px 8px 2px 0;${MAIL_FONT}font-size:14px;line-height:20px;color:${ink};">${label}</td>
<td align="right" style="padding:8px 0 2px;${MAIL_FONT}font-size:14px;line-height:20px;color:${ink};white-space:nowrap;">${amount}</td></tr>
<tr><td colspan="2" style="padding:0 0 8px;border-bottom:1px solid ${hair};">${track(markup`${left}${middle}${right}`)}</td></tr>`
}

/** Which side of the bars means what. */
export function differenceBarHead(): Markup {
  const cell = (kind: SchemeKind, align: string) =>
    markup`<td align="${align}" style="padding:0 0 4px;${MAIL_FONT}font-size:13px;line-height:18px;color:${WORD_COLOUR[kind]};">${kind === 'ribbed' ? 'to the left: ribbed cheaper' : 'to the right: solid cheaper'}</td>`
  return markup`<tr>${cell('ribbed', 'left')}${cell('solid', 'right')}</tr>
<tr><td colspan="2" style="border-top:1px solid ${inkSecond};font-size:1px;line-height:1px;">&nbsp;</td></tr>`
}
