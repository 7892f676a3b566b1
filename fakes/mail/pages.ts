// What a person sees of the caught mail.
import { escapeHtml, page, table } from '../page'
import type { CaughtMail } from './store'

export function listPage(mails: CaughtMail[]): string {
  const rows = mails
    .toReversed()
    .map((mail) => [
      escapeHtml(mail.receivedAt.slice(11, 19)),
      escapeHtml(mail.to.join(', ')),
      `<a href="/messages/${mail.id}">${escapeHtml(mail.subject || '(no subject)')}</a>`,
    ])
  const found = rows.length ? table(['Caught, UTC', 'To', 'Subject'], rows) : '<p>Nothing caught yet.</p>'
  return page(
    'Caught mail',
    `<h1>Caught mail</h1><p>A local mail server took these. Nothing leaves this machine. Reload to see newer ones.</p>${found}`,
  )
}

export function mailPage(mail: CaughtMail): string {
  const head = mail.raw.split(/\r?\n\r?\n/, 1)[0] ?? ''
  return page(
    mail.subject,
    `<p><a href="/">All caught mail</a></p><h1>${escapeHtml(mail.subject)}</h1>
<p>To ${escapeHtml(mail.to.join(', '))}, caught ${escapeHtml(mail.receivedAt)}. <a href="/messages/${mail.id}.eml">Raw mail</a></p>
<h2>As a mail program shows it</h2><iframe title="HTML part" sandbox="allow-popups allow-popups-to-escape-sandbox" src="/messages/${mail.id}/html"></iframe>
<h2>As plain text</h2><pre>${escapeHtml(mail.text)}</pre>
<h2>Headers</h2><pre>${escapeHtml(head)}</pre>`,
  )
}

/** Runs nothing and loads nothing; links open a tab of their own. */
export const HTML_PART_HEADERS = {
  'Content-Type': 'text/html; charset=utf-8',
  'Content-Security-Policy':
    "sandbox allow-popups allow-popups-to-escape-sandbox; default-src 'none'; style-src 'unsafe-inline'; img-src data:",
}

export function htmlPart(mail: CaughtMail): string {
  return `<base target="_blank">${mail.html}`
}
