import { readFileSync } from 'node:fs'
import type { AddressObject, ParsedMail } from 'mailparser'
import { markup, type Markup } from '../reports/markup'
import { PRODUCT_MARK } from '../reports/productMark'

/** Style sheet of these pages, served from a route of its own. */
export const LOCAL_MAIL_STYLE = readFileSync(new URL('./localMail.css', import.meta.url), 'utf8')

/** A mail that arrived, under the id of its file. */
export interface ArrivedMail {
  readonly id: string
  readonly mail: ParsedMail
}

/** Names and addresses as a reader wants them: `Cleo Client, cleo@example.test`. */
function addressText(address: AddressObject | AddressObject[] | undefined): string {
  const boxes = [address ?? []].flat().flatMap(({ value }) => value)
  return boxes.map((box) => [box.name, box.address ?? ''].filter((part) => part !== '').join(', ')).join('; ')
}

function momentText(date: Date | undefined): string {
  if (date === undefined) return 'no date'
  return `${date.toLocaleString('en-GB', { dateStyle: 'long', timeStyle: 'short', timeZone: 'UTC' })} UTC`
}

function sizeText(bytes: number): string {
  return bytes < 1024 ? `${bytes} bytes` : `${Math.round(bytes / 1024).toLocaleString('en-GB')} kB`
}

function page(title: string, body: Markup): string {
  return markup`<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${title}</title>
<link rel="stylesheet" href="/mail/style.css">
</head>
<body>
<header><a href="/mail">${PRODUCT_MARK}<span>Local mail</span></a><p>What arrived over SMTP in this local set-up. Nothing leaves this machine.</p></header>
<main>${body}</main>
</body>
</html>
`.text
}

function row({ id, mail }: ArrivedMail): Markup {
  const attached =
    mail.attachments.length === 0 ? '' : mail.attachments.map(({ filename }) => filename ?? 'unnamed file').join(', ')
  return markup`<tr>
<td><a href="/mail/${id}">${mail.subject ?? 'no subject'}</a>${attached === '' ? '' : markup`<span class="attached">with ${attached}</span>`}</td>
<td>${addressText(mail.to)}</td>
<td class="moment">${momentText(mail.date)}</td>
</tr>`
}

/** Everything that arrived, newest first. */
export function localMailList(arrived: readonly ArrivedMail[], total: number): string {
  const body =
    arrived.length === 0
      ? markup`<h1>No mail yet</h1><p class="empty">Send a comparison to a contact of a project, invite somebody, or ask for a new password: the mail arrives here.</p>`
      : markup`<h1>${total === 1 ? 'One mail' : `${total} mails`} arrived</h1>
<table>
<thead><tr><th scope="col">Subject</th><th scope="col">To</th><th scope="col">Date</th></tr></thead>
<tbody>${arrived.map(row)}</tbody>
</table>
${total > arrived.length ? markup`<p class="empty">The newest ${arrived.length} are listed.</p>` : ''}`
  return page('Local mail', body)
}

function attachmentList({ id, mail }: ArrivedMail): Markup {
  if (mail.attachments.length === 0) return markup`<p>none</p>`
  return markup`<ul>${mail.attachments.map(
    ({ filename, size, contentType }, index) =>
      markup`<li><a href="/mail/${id}/attachments/${index}" download>${filename ?? 'unnamed file'}</a> <span class="quiet">${contentType}, ${sizeText(size)}</span></li>`,
  )}</ul>`
}

/** One mail: its header, its HTML in a frame of its own that may run nothing, its text, its attachments. */
export function localMailMessage(arrived: ArrivedMail): string {
  const { id, mail } = arrived
  const fields: [string, string][] = [
    ['From', addressText(mail.from)],
    ['To', addressText(mail.to)],
    ['Date', momentText(mail.date)],
    ['Message-ID', mail.messageId ?? 'none'],
  ]
  const body = markup`<p><a href="/mail">All mails</a></p>
<h1>${mail.subject ?? 'no subject'}</h1>
<dl>${fields.map(([name, value]) => markup`<dt>${name}</dt><dd>${value}</dd>`)}<dt>Attachments</dt><dd>${attachmentList(arrived)}</dd></dl>
${typeof mail.html === 'string' ? markup`<h2>As HTML</h2><iframe src="/mail/${id}/html" sandbox title="The mail as HTML"></iframe>` : ''}
<h2>As text</h2>
<pre>${mail.text ?? 'This mail has no text.'}</pre>`
  return page(mail.subject ?? 'Local mail', body)
}
