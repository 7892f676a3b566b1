// The e-mail port over real SMTP: what arrives, and how each refusal is told apart.
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest'
import { startMailFake } from '@/fakes/mail/server'
import type { MailFake } from '@/fakes/mail/server'
import type { CaughtMail } from '@/fakes/mail/store'
import { DeliveryError } from '@/lib/messaging/port'
import type { EmailMessage, EmailTransport } from '@/lib/messaging/port'
import { createSmtpTransport } from '@/lib/messaging/smtp'

const from = 'Nightsheet <alerts@nightsheet.test>'
let fake: MailFake
let transport: EmailTransport

beforeAll(async () => {
  fake = await startMailFake({ smtpPort: 0, pagePort: 0 })
  transport = createSmtpTransport({ url: fake.smtpUrl, from })
})
afterAll(() => fake.close())
beforeEach(async () => {
  await fetch(`${fake.url}/api/messages`, { method: 'DELETE' })
  await setFault('none')
})

const mail: EmailMessage = {
  to: 'keeper@birch.test',
  subject: 'Birch Lane: flood tonight, −9 °C',
  text: 'Flood tonight between 8 pm and 1 am.\nLa glace à Québec.',
  html: '<p>Flood tonight between 8 pm and 1 am.</p>',
  messageId: '<message-17@nightsheet.test>',
  unsubscribeUrl: 'https://nightsheet.test/api/unsubscribe?token=abc&channel=email',
}

async function setFault(kind: string, times = 1) {
  await fetch(`${fake.url}/__fake/fault`, { method: 'POST', body: JSON.stringify({ kind, times }) })
}

async function caughtFor(to: string): Promise<CaughtMail[]> {
  const response = await fetch(`${fake.url}/api/messages?to=${encodeURIComponent(to)}`)
  return (await response.json()) as CaughtMail[]
}

/** The error of a delivery that must fail. */
async function failure(message: EmailMessage, through = transport): Promise<DeliveryError> {
  const error: unknown = await through.send(message).then(
    () => undefined,
    (reason: unknown) => reason,
  )
  if (!(error instanceof DeliveryError)) throw new Error('expected a DeliveryError')
  return error
}

describe('what arrives', () => {
  test('both parts and the subject arrive as they were written', async () => {
    await transport.send(mail)
    const [caught] = await caughtFor(mail.to)
    expect(caught).toMatchObject({ from: 'alerts@nightsheet.test', to: [mail.to], subject: mail.subject })
    expect(caught?.text.trim()).toBe(mail.text)
    expect(caught?.html.trim()).toBe(mail.html)
  })

  test('the raw headers carry the stable id and one-click unsubscribe, RFC 8058 section 3.1', async () => {
    await transport.send(mail)
    const headers = new Map((await caughtFor(mail.to))[0]?.headers.map(({ name, value }) => [name, value]))
    expect(headers.get('Message-ID')).toBe(mail.messageId)
    expect(headers.get('List-Unsubscribe')).toBe(`<${mail.unsubscribeUrl}>`)
    expect(headers.get('List-Unsubscribe-Post')).toBe('List-Unsubscribe=One-Click')
    expect(headers.get('Auto-Submitted')).toBe('auto-generated')
  })

  test('mail about the account has no list headers', async () => {
    await transport.send({ ...mail, unsubscribeUrl: undefined })
    const names = (await caughtFor(mail.to))[0]?.headers.map(({ name }) => name)
    expect(names?.filter((name) => name.startsWith('List-'))).toEqual([])
  })

  test('a subject with a line break adds no header and no recipient', async () => {
    await transport.send({ ...mail, subject: 'Rink\r\nBcc: stranger@birch.test\r\n\r\nbody' })
    const [caught] = await caughtFor(mail.to)
    expect(caught?.to).toEqual([mail.to])
    expect(caught?.headers.map(({ name }) => name.toLowerCase())).not.toContain('bcc')
    expect(await caughtFor('stranger@birch.test')).toEqual([])
  })

  test('the page, the raw mail and the HTML part can be read, the last in a sandbox', async () => {
    await transport.send(mail)
    const id = (await caughtFor(mail.to))[0]?.id
    const list = await (await fetch(fake.url)).text()
    expect(list).toContain('keeper@birch.test')
    expect(await (await fetch(`${fake.url}/messages/${id}`)).text()).toContain('List-Unsubscribe-Post')
    expect(await (await fetch(`${fake.url}/messages/${id}.eml`)).text()).toContain('MIME-Version: 1.0')
    const part = await fetch(`${fake.url}/messages/${id}/html`)
    expect(part.headers.get('content-security-policy')).toMatch(/^sandbox (?!.*allow-scripts)/)
    expect((await fetch(`${fake.url}/messages/999`)).status).toBe(404)
  })
})

describe('what fails', () => {
  test('a mailbox that does not exist is permanent, and its address stays out of the error', async () => {
    const error = await failure({ ...mail, to: 'bounce@birch.test' })
    expect(error.permanent).toBe(true)
    expect(error.message).toContain('550 5.1.1')
    expect(`${error.message} ${String(error.cause)}`).not.toContain('birch.test')
  })

  test('a greylisted address is taken at the second try', async () => {
    const greylisted = { ...mail, to: 'greylist@birch.test' }
    expect((await failure(greylisted)).permanent).toBe(false)
    await transport.send(greylisted)
    expect(await caughtFor(greylisted.to)).toHaveLength(1)
  })

  test.each(['451', 'drop'])('%s is temporary, and the next try arrives', async (kind) => {
    await setFault(kind)
    expect((await failure(mail)).permanent).toBe(false)
    await transport.send(mail)
    expect(await caughtFor(mail.to)).toHaveLength(1)
  })

  test('a server that says nothing is given up after the time limit, as temporary', async () => {
    await setFault('hang')
    const impatient = createSmtpTransport({ url: fake.smtpUrl, from, silenceMillis: 500 })
    expect((await failure(mail, impatient)).permanent).toBe(false)
  })

  test('a fault lasts as many times as told', async () => {
    await setFault('550', 2)
    expect((await failure(mail)).permanent).toBe(true)
    expect((await failure(mail)).permanent).toBe(true)
    await transport.send(mail)
  })

  test('a server that is not there is temporary', async () => {
    const gone = await startMailFake({ smtpPort: 0, pagePort: 0 })
    await gone.close()
    const lost = createSmtpTransport({ url: gone.smtpUrl, from })
    await expect(lost.send(mail)).rejects.toMatchObject({ name: 'DeliveryError', permanent: false })
  })

  test.each([
    'two@birch.test, three@birch.test',
    'a@birch.test\r\nRCPT TO:<b@birch.test>',
    '<a@birch.test>',
    'nobody',
    '',
  ])('what is not one address is refused before any server hears of it: %j', async (to) => {
    expect((await failure({ ...mail, to })).permanent).toBe(true)
    expect(await (await fetch(`${fake.url}/api/messages`)).json()).toEqual([])
  })
})
