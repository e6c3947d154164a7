import { escapeMarkup } from '#shared/drawing/svgText'

/** Subject and both bodies of a mail that carries one link. */
export interface LinkMail {
  readonly subject: string
  readonly text: string
  readonly html: string
}

const PAPER = 'background:#F6F4EF;color:#1E2930;font-family:Source Sans 3,Segoe UI,Helvetica,Arial,sans-serif'

function htmlOf(paragraphs: readonly string[], link: string): string {
  const lines = paragraphs.map((text) => `<p style="margin:0 0 16px;font-size:16px;line-height:1.5">${escapeMarkup(text)}</p>`)
  const address = escapeMarkup(link)
  const body = [
    ...lines,
    `<p style="margin:0 0 16px;font-size:16px"><a href="${address}" style="color:#1D4FA8">${address}</a></p>`,
  ]
  return `<!doctype html><html lang="en"><body style="margin:0;padding:24px;${PAPER}">${body.join('')}</body></html>`
}

function mailOf(subject: string, paragraphs: readonly string[], link: string): LinkMail {
  return { subject, text: `${[...paragraphs, link].join('\n\n')}\n`, html: htmlOf(paragraphs, link) }
}

/**
 * The mail that invites somebody into a firm. The token stands behind `#`, so that no server on the way sees it.
 *
 * @param origin - configured address of the application, never one from a request
 */
export function invitationMail(origin: string, firmName: string, name: string, token: string): LinkMail {
  return mailOf(
    `${firmName} invites you to Bothways`,
    [
      `Dear ${name},`,
      `${firmName} has opened an account for you at Bothways, where floors are appraised both ways, ribbed and solid. Choose a password by this link within seven days; it works once.`,
    ],
    `${origin}/invitation#${token}`,
  )
}

/** The mail by which somebody sets a new password. @param origin - as for `invitationMail` */
export function passwordResetMail(origin: string, name: string, token: string): LinkMail {
  return mailOf(
    'A new password for Bothways',
    [
      `Dear ${name},`,
      'Somebody, we hope you, asked to set a new password for this address. Do so by this link within ten minutes; it works once and signs you out everywhere. If it was not you, nothing has changed and you need do nothing.',
    ],
    `${origin}/reset#${token}`,
  )
}
