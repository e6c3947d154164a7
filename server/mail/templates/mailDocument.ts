import { markup, type Markup } from '../../reports/markup'

/** Colours of the look, as mail programs take them: in every element's own style. */
export const MAIL_COLOURS = {
  paper: '#f6f4ef',
  hair: '#d3cec2',
  ink: '#1e2930',
  inkSecond: '#4c585f',
  clay: '#b4532a',
  clayInk: '#a34722',
  slate: '#46606e',
} as const
export const MAIL_FONT = "font-family:'Source Sans 3','Source Sans Pro',Helvetica,Arial,sans-serif;"

const { paper, ink } = MAIL_COLOURS

/**
 * A mail as a document that needs nothing from outside: one column of tables, at most 600 px, styles inline, no image.
 * @param preheader - what mail programs show beside the subject
 */
export function mailDocument(title: string, preheader: string, body: Markup): string {
  return markup`<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light">
<title>${title}</title>
</head>
<body style="margin:0;padding:0;background:${paper};color:${ink};">
<div style="display:none;max-height:0;overflow:hidden;">${preheader}</div>
<table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0" style="background:${paper};">
<tr><td align="center" style="padding:16px;">
<table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0" style="max-width:600px;border:2px solid ${ink};background:${paper};">
<tr><td style="padding:20px 20px 24px;${MAIL_FONT}font-size:15px;line-height:24px;color:${ink};text-align:left;">
${body}
</td></tr>
</table>
</td></tr>
</table>
</body>
</html>
`.text
}

/** Heading of a part, over a line. */
export function mailHeading(text: string): Markup {
  return markup`<h2 style="margin:28px 0 0;padding:16px 0 8px;border-top:1px solid ${ink};${MAIL_FONT}font-size:20px;line-height:26px;font-weight:600;color:${ink};">${text}</h2>`
}

export function mailParagraph(text: string): Markup {
  return markup`<p style="margin:12px 0 0;${MAIL_FONT}font-size:15px;line-height:24px;color:${ink};">${text}</p>`
}

/** Small print. */
export function mailNote(text: string): Markup {
  return markup`<p style="margin:8px 0 0;${MAIL_FONT}font-size:13px;line-height:18px;color:${MAIL_COLOURS.inkSecond};">${text}</p>`
}
