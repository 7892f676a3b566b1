// The frame of the pages on which a person reads what the fakes caught.

const STYLE = `
:root{color-scheme:light dark;--paper:#F6F3EC;--sheet:#FFFDF8;--ink:#1B2530;--graphite:#56616D;--rule:#D9D3C5;--lamp:#B87503}
@media (prefers-color-scheme:dark){:root{--paper:#0F161D;--sheet:#172029;--ink:#EEF1F2;--graphite:#A3AEB8;--rule:#2B3742;--lamp:#F2BE5C}}
*{box-sizing:border-box}
body{margin:0 auto;max-width:920px;padding:24px 20px 64px;background:var(--paper);color:var(--ink);font:400 16px/1.5 "IBM Plex Sans",system-ui,sans-serif;font-variant-numeric:tabular-nums}
h1{font-size:28px;font-weight:500;line-height:1.2;margin:0 0 4px}
h2{font-size:17px;font-weight:600;margin:28px 0 8px}
p{margin:4px 0 16px;color:var(--graphite);max-width:68ch}
a{color:inherit;text-underline-offset:3px}
:focus-visible{outline:2px solid var(--lamp);outline-offset:2px}
table{width:100%;border-collapse:collapse;background:var(--sheet);border:1px solid var(--rule)}
th,td{text-align:left;vertical-align:top;padding:10px 12px;border-top:1px solid var(--rule);overflow-wrap:break-word}
th,td:first-child{white-space:nowrap}
th{font-size:13px;font-weight:500;color:var(--graphite);border-top:0}
pre{white-space:pre-wrap;overflow-wrap:anywhere;background:var(--sheet);border:1px solid var(--rule);padding:14px;margin:0;font:13px/1.5 ui-monospace,monospace}
iframe{width:100%;height:640px;border:1px solid var(--rule);background:#FFFDF8}
.gone{color:var(--graphite);text-decoration:line-through}`

export function escapeHtml(text: string): string {
  const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' }
  return text.replace(/[&<>"']/g, (character) => entities[character] ?? character)
}

/** `body` is finished HTML. */
export function page(title: string, body: string): string {
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1">
<title>${escapeHtml(title)}</title><link rel="icon" href="data:,"><style>${STYLE}</style></head><body>${body}</body></html>`
}

/** A table whose cells are finished HTML. */
export function table(headings: string[], rows: string[][]): string {
  const head = headings.map((heading) => `<th scope="col">${escapeHtml(heading)}</th>`).join('')
  const body = rows.map((cells) => `<tr>${cells.map((cell) => `<td>${cell}</td>`).join('')}</tr>`).join('\n')
  return `<table><thead><tr>${head}</tr></thead><tbody>${body}</tbody></table>`
}

export const PAGE_HEADERS = {
  'Content-Type': 'text/html; charset=utf-8',
  'Content-Security-Policy':
    "default-src 'none'; style-src 'unsafe-inline'; img-src data:; frame-src 'self'; form-action 'self'",
}
