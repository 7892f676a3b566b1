// The HTML of a letter. Tables and inline styles, because mail programs drop the rest; light colours of the product.
import type { Letter, LetterList, Link } from './letter'
import { markup } from './markup'
import type { Markup } from './markup'

const PAPER = '#F6F3EC'
const SHEET = '#FFFDF8'
const INK = '#1B2530'
const GRAPHITE = '#56616D'
const RULE = '#D9D3C5'
const RUST = '#A63F25'

const FONT = 'font-family:IBM Plex Sans,-apple-system,Segoe UI,Roboto,Helvetica,Arial,sans-serif'
const SMALL = `${FONT};font-size:13px;line-height:20px;color:${GRAPHITE}`
const NOTE = `${FONT};font-size:15px;line-height:22px;color:${INK}`
const BODY = `${FONT};font-size:17px;line-height:25px;color:${INK}`

export function letterHtml(letter: Letter): string {
  const { subject, kicker, heading, paragraphs, lists, action, closing } = letter
  const content = markup`
<p style="margin:0 0 12px;${SMALL}">${kicker}</p>
<h1 style="margin:0 0 8px;${FONT};font-size:26px;line-height:32px;font-weight:500;color:${INK}">${heading}</h1>
${paragraphs.map((text) => markup`<p style="margin:0 0 8px;${BODY}">${text}</p>\n`)}
${lists.map(listPart)}
${button(action)}
${closing.map((text) => markup`<p style="margin:16px 0 0;${NOTE}">${text}</p>\n`)}`

  const sheet = table(
    `width:100%;max-width:600px;background:${SHEET};border:1px solid ${RULE}`,
    markup`<tr><td style="padding:24px 24px 28px">${content}</td></tr>`,
  )
  const below = table(
    'width:100%;max-width:600px',
    markup`<tr><td style="padding:16px 24px;${SMALL}">${foot(letter)}</td></tr>`,
  )
  const page = markup`<tr><td align="center" style="padding:24px 12px">${sheet}\n${below}</td></tr>`

  return markup`<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1">
<meta name="color-scheme" content="light"><meta name="supported-color-schemes" content="light">
<title>${subject}</title>
</head>
<body style="margin:0;padding:0;background:${PAPER}">
${preheader(paragraphs[0] ?? heading)}
${table(`width:100%;background:${PAPER}`, page)}
</body>
</html>`.html
}

/** For layout only: a screen reader is told so. */
function table(style: string, rows: Markup | Markup[]): Markup {
  return markup`<table role="presentation" cellpadding="0" cellspacing="0" border="0" style="${style}">${rows}</table>`
}

/** What an inbox shows beside the subject; the filler keeps it from running on into the body. */
function preheader(text: string): Markup {
  const hidden = `display:none;max-height:0;max-width:0;overflow:hidden;opacity:0;font-size:1px;line-height:1px;color:${PAPER}`
  return markup`<div style="${hidden}">${text}${'\u00A0\u200C'.repeat(60)}</div>`
}

function listPart({ title, items, isCaution }: LetterList): Markup {
  const edge = isCaution ? `;border-left:3px solid ${RUST};padding-left:12px` : ''
  const rows = items.map(({ lead, text }) => row(lead, text, isCaution ? '' : `border-top:1px solid ${RULE};`))
  return markup`<div style="margin:20px 0 0${edge}">
<h2 style="margin:0 0 6px;${NOTE};font-weight:600">${title}</h2>
${table('width:100%', rows)}
</div>
`
}

function row(lead: string | undefined, text: string, rule: string): Markup {
  const cell = `${rule}padding:7px 0;vertical-align:top;${NOTE}`
  if (!lead) return markup`<tr><td style="${cell}">${text}</td></tr>\n`
  return markup`<tr><td width="92" style="${cell};font-weight:600;white-space:nowrap">${lead}</td>
<td style="${cell}">${text}</td></tr>
`
}

/** A coloured cell with a padded link, which shows as a button even where padding on links is ignored. */
function button({ label, url }: Link): Markup {
  const style = `display:inline-block;padding:13px 20px;${BODY};font-weight:500;color:${PAPER};text-decoration:none`
  const cell = markup`<tr><td style="background:${INK};border-radius:4px"><a href="${url}" style="${style}">${label}</a></td></tr>`
  return table('margin:24px 0 0', cell)
}

function foot({ reason, footLinks }: Letter): Markup {
  const style = `color:${GRAPHITE};text-decoration:underline`
  const links = footLinks.map(
    ({ label, url }) => markup`<p style="margin:0 0 4px"><a href="${url}" style="${style}">${label}</a></p>\n`,
  )
  return markup`<p style="margin:0 0 8px">${reason}</p>\n${links}`
}
