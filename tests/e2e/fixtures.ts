// What every journey needs: a page whose console stays clean, the caught mail, and axe.
import AxeBuilder from '@axe-core/playwright'
import { test as base, expect, type Page } from '@playwright/test'

export { expect }

/** Chromium's own words for answers that a journey provokes on purpose. */
const EXPECTED = [
  /Failed to load resource: the server responded with a status of (404|422|403)/,
  /Failed to load resource: net::ERR_INTERNET_DISCONNECTED/,
  // A file that the service worker was asked for without a network.
  /Failed to load resource: net::ERR_FAILED \S+\/_next\/static\//,
]

export const test = base.extend<{ cleanConsole: void }>({
  cleanConsole: [
    async ({ page }, run) => {
      const errors: string[] = []
      page.on('pageerror', (error) => errors.push(String(error)))
      page.on('console', (message) => {
        const said = `${message.text()} ${message.location().url}`.trim()
        if (message.type() === 'error' && !EXPECTED.some((known) => known.test(said))) errors.push(said)
      })
      await run()
      expect(errors, 'nothing unexpected on the console').toEqual([])
    },
    { auto: true },
  ],
})

function setting(name: string): string {
  const value = process.env[name]
  if (!value) throw new Error(`${name} is missing: start the journeys with \`npm run e2e\`.`)
  return value
}

interface CaughtMail {
  id: string
  subject: string
  text: string
}

/** The newest mail to an address whose subject matches; waits until it is there. */
export async function mailTo(address: string, subject: RegExp): Promise<CaughtMail> {
  let found: CaughtMail | undefined
  await expect
    .poll(
      async () => {
        const response = await fetch(`${setting('FAKE_MAIL_URL')}/api/messages?to=${encodeURIComponent(address)}`)
        const caught = (await response.json()) as CaughtMail[]
        found = caught.find((mail) => subject.test(mail.subject))
        return found?.subject
      },
      { message: `a mail to ${address} with ${subject}`, timeout: 30_000 },
    )
    .toBeTruthy()
  if (!found) throw new Error('unreachable')
  const whole = await fetch(`${setting('FAKE_MAIL_URL')}/api/messages/${found.id}`)
  return { ...found, ...((await whole.json()) as Partial<CaughtMail>) }
}

export async function mailCount(address: string, subject: RegExp): Promise<number> {
  const response = await fetch(`${setting('FAKE_MAIL_URL')}/api/messages?to=${encodeURIComponent(address)}`)
  return ((await response.json()) as CaughtMail[]).filter((mail) => subject.test(mail.subject)).length
}

/** The first address in a text that leads to a path. */
export function linkIn(text: string, path: string): string {
  const link = new RegExp(`https?://[^\\s<>"]+${path}[^\\s<>"]*`).exec(text)?.[0]
  if (!link) throw new Error(`No link to ${path} in: ${text}`)
  return link
}

interface FakeSubscription {
  id: string
  endpoint: string
  keys: { p256dh: string; auth: string }
}

export async function newFakeSubscription(): Promise<FakeSubscription> {
  const response = await fetch(`${setting('FAKE_PUSH_URL')}/subscriptions`, { method: 'POST', body: '{}' })
  return (await response.json()) as FakeSubscription
}

/** The decrypted text of the newest push to a device; waits until it is there. */
export async function pushTo(id: string): Promise<string> {
  let text: string | undefined
  await expect
    .poll(
      async () => {
        const response = await fetch(`${setting('FAKE_PUSH_URL')}/api/messages?id=${id}`)
        text = ((await response.json()) as { text: string }[])[0]?.text
        return text
      },
      { message: 'a push', timeout: 30_000 },
    )
    .toBeTruthy()
  return text ?? ''
}

/** No violation in light or dark. */
export async function expectAccessible(page: Page): Promise<void> {
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme })
    const { violations } = await new AxeBuilder({ page }).analyze()
    expect(
      violations.map(({ id, nodes }) => ({ id, where: nodes.map((node) => node.target.join(' ')) })),
      `axe, ${colorScheme}, ${page.url()}`,
    ).toEqual([])
  }
  await page.emulateMedia({ colorScheme: null })
}
