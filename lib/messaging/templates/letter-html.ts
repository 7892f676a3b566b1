// The HTML of a letter. Tables and inline styles, because mail programs drop the rest; light colours of the product.
import { html } from './html'
import type { Markup } from './html'
import type { Letter, LetterList, Link } from './letter'

const PAPER = '#F6F3EC'
const SHEET = '#FFFDF8'
const INK = '#1B2530'
const GRAPHITE = '#56616D'
const RULE = '#D9D3C5'
const RUST = '#A63F25'

const FONT = "font-family:'IBM Plex Sans',-apple-system,'Segoe UI',Roboto,Helvetica,Arial,sans-serif"
const SMALL = `${FONT};font-size:13px;line-height:20px;color:${GRAPHITE}`
const BODY = `${FONT};font-size:17px;line-height:25px;color:${INK}`

export function letterHtml(letter: Letter): string {
  const { subject, kicker, heading, paragraphs, lists, action, closing } = letter
  return html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width,initial-scale=1" />
        <meta name="color-scheme" content="light" />
        <meta name="supported-color-schemes" content="light" />
        <title>${subject}</title>
      </head>
      <body style="margin:0;padding:0;background:${PAPER}">
        ${preheader(paragraphs[0] ?? heading)}
        <table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0" style="background:${PAPER}">
          <tr>
            <td align="center" style="padding:24px 12px">
              <table
                role="presentation"
                width="100%"
                cellpadding="0"
                cellspacing="0"
                border="0"
                style="max-width:600px;background:${SHEET};border:1px solid ${RULE}"
              >
                <tr>
                  <td style="padding:24px 24px 28px">
                    <p style="margin:0 0 12px;${SMALL}">${kicker}</p>
                    <h1 style="margin:0 0 8px;${FONT};font-size:26px;line-height:32px;font-weight:500;color:${INK}">
                      ${heading}
                    </h1>
                    ${paragraphs.map((text) => html`<p style="margin:0 0 8px;${BODY}">${text}</p>`)}
                    ${lists.map(listHtml)} ${button(action)}
                    ${closing.map((text) => html`<p style="margin:16px 0 0;${FONT};font-size:15px;line-height:22px;color:${INK}">${text}</p>`)}
                  </td>
                </tr>
              </table>
              ${foot(letter)}
            </td>
          </tr>
        </table>
      </body>
    </html>`.html
}

/** What an inbox shows beside the subject; the filler keeps it from running on into the body. */
function preheader(text: string): Markup {
  const hidden = `display:none;max-height:0;max-width:0;overflow:hidden;opacity:0;font-size:1px;line-height:1px;color:${PAPER}`
  return html`<div style="${hidden}">${text}${'\u00A0\u200C'.repeat(60)}</div>`
}

function listHtml({ title, items, isCaution }: LetterList): Markup {
  const edge = isCaution ? `border-left:3px solid ${RUST};padding-left:12px` : ''
  const rows = items.map(({ lead, text }) => row(lead, text, isCaution ? '' : `border-top:1px solid ${RULE};`))
  return html`<div style="margin:20px 0 0;${edge}">
    <h2 style="margin:0 0 6px;${FONT};font-size:15px;line-height:22px;font-weight:600;color:${INK}">${title}</h2>
    <table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0">
      ${rows}
    </table>
  </div>`
}

function row(lead: string | undefined, text: string, rule: string): Markup {
  const cell = `${rule}padding:7px 0;vertical-align:top;${FONT};font-size:15px;line-height:22px;color:${INK}`
  if (!lead)
    return html`<tr>
      <td style="${cell}">${text}</td>
    </tr>`
  return html`<tr>
    <td width="92" style="${cell};font-weight:600;white-space:nowrap">${lead}</td>
    <td style="${cell}">${text}</td>
  </tr>`
}

/** A coloured cell with a padded link, which shows as a button even where padding on links is ignored. */
function button({ label, url }: Link): Markup {
  return html`<table role="presentation" cellpadding="0" cellspacing="0" border="0" style="margin:24px 0 0">
    <tr>
      <td style="background:${INK};border-radius:4px">
        <a
          href="${url}"
          style="display:inline-block;padding:13px 20px;${FONT};font-size:17px;line-height:22px;font-weight:500;color:${PAPER};text-decoration:none"
          >${label}</a
        >
      </td>
    </tr>
  </table>`
}

function foot({ reason, footLinks }: Letter): Markup {
  const links = footLinks.map(
    ({ label, url }) =>
      html`<p style="margin:0 0 4px">
        <a href="${url}" style="color:${GRAPHITE};text-decoration:underline">${label}</a>
      </p>`,
  )
  return html`<table
    role="presentation"
    width="100%"
    cellpadding="0"
    cellspacing="0"
    border="0"
    style="max-width:600px"
  >
    <tr>
      <td style="padding:16px 24px;${SMALL}">
        <p style="margin:0 0 8px">${reason}</p>
        ${links}
      </td>
    </tr>
  </table>`
}
