// What a person sees of the caught pushes.
import { z } from 'zod'
import { escapeHtml, page, table } from '../page'
import type { CaughtPush } from './store'

/** What the product's service worker shows; anything else is listed as bare text. */
const shownSchema = z.object({ title: z.string(), body: z.string(), url: z.string() })

export function listPage(pushes: CaughtPush[]): string {
  const rows = pushes
    .toReversed()
    .map((push) => [
      escapeHtml(push.receivedAt.slice(11, 19)),
      describe(push),
      `${push.ttlSeconds} s, urgency ${escapeHtml(push.urgency)}, ${push.sizeBytes} bytes`,
      escapeHtml(push.subscriptionId.slice(0, 8)),
    ])
  const found = rows.length
    ? table(['Caught, UTC', 'Decrypted', 'Kept for', 'Subscription'], rows)
    : '<p>Nothing caught yet.</p>'
  return page(
    'Caught pushes',
    `<h1>Caught pushes</h1><p>A local push service took these over TLS and opened them with the subscriber’s own key. Struck through: a newer push with the same topic took its place. Reload to see newer ones.</p>${found}`,
  )
}

function describe({ text, payload, isReplaced }: CaughtPush): string {
  const { data: shown } = shownSchema.safeParse(payload)
  const words = shown
    ? `<b>${escapeHtml(shown.title)}</b><br>${escapeHtml(shown.body)}<br><small>opens ${escapeHtml(shown.url)}</small>`
    : escapeHtml(text)
  return isReplaced ? `<span class="gone">${words}</span>` : words
}
