// What the templates write: both sides tell the same, values stay values, links stay web links.
import { describe, expect, test } from 'vitest'
import {
  addressAlreadyRegisteredMail,
  deletionAskedMail,
  resetPasswordMail,
  signInLinkMail,
  verifyAddressMail,
} from '@/lib/messaging/templates/account'
import { alertMail, alertPush } from '@/lib/messaging/templates/alerts'
import type { AlertKind, AlertWords } from '@/lib/messaging/templates/alerts'
import { invitationMail } from '@/lib/messaging/templates/invitation'

const words: AlertWords = {
  rinkName: 'Birch Lane',
  nightLabel: 'Tue 12 to Wed 13 January',
  sentence: 'Flood tonight between 8 pm and 1 am.',
  sure: '9 of 10 forecast runs agree.',
  passes: [{ at: '8:00 pm', what: '3 mm over the whole sheet, set by 9:50 pm' }],
  cautions: ['At midnight it feels like −14 °C: cover skin.'],
  why: ['Clear sky. The sheet loses heat straight to the sky.'],
  tonightUrl: 'https://nightsheet.test/rinks/1?from=mail&night=2026-01-12',
  unsubscribeUrl: 'https://nightsheet.test/api/unsubscribe?token=abc',
  manageUrl: 'https://nightsheet.test/rinks/1/alerts',
}
const kinds: AlertKind[] = ['flood-tonight', 'flood-changed', 'flood-closed', 'thaw-ahead']
const link = { url: 'https://nightsheet.test/sign-in?token=abc', validFor: '15 minutes' }
const accountMails = [
  verifyAddressMail(link),
  signInLinkMail(link),
  resetPasswordMail(link),
  addressAlreadyRegisteredMail({ signInUrl: link.url, resetUrl: 'https://nightsheet.test/reset' }),
]

/** The HTML as a reader sees it: without tags, with the characters that were escaped. */
function visibleText(html: string): string {
  const decoded = html
    .replace(/<[^>]*>/g, ' ')
    .replace(/&#(\d+);/g, (_entity, code) => String.fromCharCode(Number(code)))
  return decoded.replace(/[\s\u00A0\u200C]+/g, ' ')
}

describe('alert mail', () => {
  test.each(kinds)('%s says everything in the text and in the HTML', (kind) => {
    const { text, html } = alertMail(kind, words)
    const said = [words.sentence, words.sure, words.nightLabel, words.passes[0]?.at, words.passes[0]?.what]
    said.push(words.cautions[0], words.why?.[0], 'Thickness is an estimate: drill and measure before anyone skates.')
    for (const part of said) {
      expect(text).toContain(part)
      expect(visibleText(html)).toContain(part)
    }
  })

  test.each(kinds)('%s links to the night, to unsubscribing and to the settings', (kind) => {
    const { text, html } = alertMail(kind, words)
    for (const url of [words.tonightUrl, words.unsubscribeUrl, words.manageUrl]) {
      expect(text).toContain(url)
      expect(html).toContain(`href="${url.replaceAll('&', '&#38;')}"`)
    }
    expect(text).toContain('You get this because you asked to be told about Birch Lane.')
  })

  test('the subject leads with the rink; changed and closed nights say so', () => {
    expect(alertMail('flood-tonight', words).subject).toBe('Birch Lane: Flood tonight between 8 pm and 1 am')
    expect(alertMail('flood-changed', words).subject).toMatch(/^Birch Lane: plan changed\./)
    expect(alertMail('flood-closed', words).subject).toMatch(/^Birch Lane: called off\./)
  })

  test('what is empty leaves no heading behind', () => {
    const { text, html } = alertMail('flood-closed', { ...words, passes: [], cautions: [], why: [] })
    for (const heading of ['The plan', 'Take care', 'Why']) {
      expect(text).not.toContain(`${heading}\n`)
      expect(html).not.toContain(`>${heading}<`)
    }
  })

  test('the HTML loads nothing and runs nothing', () => {
    expect(alertMail('flood-tonight', words).html).not.toMatch(/<(img|script|link|iframe|style)|url\(|@import/i)
  })
})

describe('values from people', () => {
  const hostile = `"><script>alert('x')</script>&amp;`

  test('markup in a name or a reason is shown, not obeyed', () => {
    const { html } = alertMail('flood-tonight', { ...words, rinkName: hostile, why: [hostile] })
    expect(html).not.toContain('<script')
    expect(html).not.toContain(hostile)
    expect(visibleText(html)).toContain(hostile)
  })

  test.each(['\r\nBcc: stranger@birch.test', '\nX', '\u2028X', '\u0000X', '\u0085X'])(
    'a line break in a name stays out of the subject and the push title: %j',
    (tail) => {
      const named = { ...words, rinkName: `Birch Lane${tail}` }
      expect(alertMail('flood-tonight', named).subject).not.toMatch(/[\p{Cc}\p{Zl}\p{Zp}]/u)
      expect(alertPush('flood-tonight', named, 'tag').title).not.toMatch(/[\p{Cc}\p{Zl}\p{Zp}]/u)
    },
  )

  test('a name cannot start a new line of the text', () => {
    const { text } = alertMail('flood-tonight', { ...words, rinkName: 'Birch\n\nPay here: https://evil.test' })
    expect(text.split('\n').some((line) => line.startsWith('Pay here'))).toBe(false)
  })

  test('direction marks do not turn a name around', () => {
    expect(alertMail('flood-tonight', { ...words, rinkName: 'Birch\u202E Lane' }).subject).not.toContain('\u202E')
  })

  test.each(['javascript:alert(1)', 'data:text/html,x', '/rinks/1', ''])(
    '%j is no link for a message',
    (tonightUrl) => {
      expect(() => alertMail('flood-tonight', { ...words, tonightUrl })).toThrow(RangeError)
    },
  )

  test('a name of any length leaves a subject that a list can show', () => {
    const { subject } = alertMail('flood-tonight', { ...words, rinkName: 'Birch '.repeat(200) })
    expect(subject.length).toBeLessThanOrEqual(140)
    expect(subject).toContain('Flood tonight')
  })
})

describe('push', () => {
  test('it names the rink, says the verdict and how sure it is, and opens the night', () => {
    expect(alertPush('flood-tonight', words, 'flood:1')).toEqual({
      title: 'Birch Lane tonight',
      body: 'Flood tonight between 8 pm and 1 am. 9 of 10 forecast runs agree.',
      url: words.tonightUrl,
      tag: 'flood:1',
    })
  })

  test('a long body is cut between words, within 180 characters', () => {
    const { body } = alertPush(
      'flood-changed',
      { ...words, sure: 'The last pass is set before the snow. '.repeat(20) },
      'tag',
    )
    expect(body.length).toBeLessThanOrEqual(180)
    expect(body).toMatch(/\w…$/)
    expect(`${words.sentence} ${'The last pass is set before the snow. '.repeat(20)}`).toContain(body.slice(0, -1))
  })

  test('a word without end is cut too, and no character is left in half', () => {
    const { body } = alertPush(
      'flood-tonight',
      { ...words, sentence: '❄'.repeat(10) + '\u{1F9CA}'.repeat(200), sure: '' },
      'tag',
    )
    expect(body.length).toBeLessThanOrEqual(180)
    expect(body).not.toMatch(/[\uD800-\uDBFF](?![\uDC00-\uDFFF])/)
  })

  test('the payload stays under 3,900 bytes whatever the words', () => {
    const long = alertPush('flood-tonight', { ...words, rinkName: '雪'.repeat(500), sure: '雪'.repeat(5000) }, 'tag')
    expect(Buffer.byteLength(JSON.stringify(long))).toBeLessThan(3900)
  })
})

describe('account mail', () => {
  test.each(accountMails)('$subject: carries its link in both parts and says why it came', ({ text, html }) => {
    expect(text).toContain(link.url)
    expect(html).toContain(`href="${link.url}"`)
    expect(text).toMatch(/You get this because .* with this address\./)
    expect(text).not.toMatch(/unsubscribe/i)
  })

  test('links that expire say when', () => {
    for (const { text } of accountMails.slice(0, 3)) expect(text).toContain('once, within 15 minutes')
  })

  test('nothing we write shouts', () => {
    for (const { subject, text } of [...accountMails, ...kinds.map((kind) => alertMail(kind, words))]) {
      expect(subject + text).not.toContain('!')
    }
  })
})

describe('an invitation', () => {
  const invitation = {
    rinkName: 'Birch Lane',
    inviterName: 'Maren Holt',
    asRole: 'as crew',
    can: 'write the log',
    validFor: '14 days',
    url: 'https://nightsheet.test/invitation?key=abc',
  }

  test('says who invites to what, as what, and for how long, in the text and in the HTML', () => {
    const { subject, text, html } = invitationMail(invitation)
    expect(subject).toBe('Maren Holt invites you to Birch Lane')
    for (const part of ['Maren Holt', 'Join Birch Lane as crew', 'You could write the log.', '14 days']) {
      expect(text).toContain(part)
      expect(visibleText(html)).toContain(part)
    }
    expect(text).toContain(invitation.url)
  })

  test.each([
    'Win a prize: https://evil.example/now',
    'evil.example',
    'claim@evil.example',
    'Maren\r\nBcc: all@evil.example',
    '<a href="https://evil.example">Maren</a>',
  ])('a name is no place for an address or a line: %o', (name) => {
    const { subject, text, html } = invitationMail({ ...invitation, inviterName: name, rinkName: name })
    expect(subject).not.toMatch(/[\r\n]/)
    for (const side of [subject, text, visibleText(html)])
      expect(side).not.toMatch(/evil\.example|https?:\/\/evil|@evil/)
    expect(html).not.toContain('<a href="https://evil')
  })

  test('a name keeps its dots and dashes, and a long one is cut', () => {
    const { subject } = invitationMail({ ...invitation, inviterName: 'J. O’Neill-Berg', rinkName: 'x'.repeat(200) })
    expect(subject).toMatch(/^J\. O’Neill-Berg invites you to x+…$/)
    expect(subject.length).toBeLessThanOrEqual(140)
  })
})

test('the end of an account cannot be read as its going on', () => {
  const { subject, text } = deletionAskedMail({ on: '15 December 2026', signInUrl: link.url })
  expect(subject).toBe('Your Nightsheet account will be deleted on 15 December 2026')
  expect(text).toContain('Your account will be deleted on 15 December 2026')
})
