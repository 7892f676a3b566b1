// The main job from end to end: sign up, set up a rink, see tonight, be told by push and mail, mute, unsubscribe.
import { randomUUID } from 'node:crypto'
import { eveningPlace } from '../support/evening-place'
import { expect, expectAccessible, linkIn, mailCount, mailTo, newFakeSubscription, pushTo, test } from './fixtures'

const PASSWORD = 'a hose in the snow 42'

test('a keeper signs up, sets a rink up, sees tonight and is told', async ({ page, context, baseURL }) => {
  test.setTimeout(240_000)
  const address = `keeper-${randomUUID().slice(0, 8)}@nightsheet.example`
  const place = eveningPlace(new Date())
  const device = await newFakeSubscription()
  await context.grantPermissions(['notifications'])
  // Chromium under test has no push service of its own: the browser's side of subscribing is stood in for, nothing of ours.
  await page.addInitScript((given) => {
    let isSubscribed = sessionStorage.getItem('subscribed') === 'yes'
    const subscription = {
      endpoint: given.endpoint,
      toJSON: () => ({ endpoint: given.endpoint, keys: given.keys }),
      unsubscribe: () => Promise.resolve(true),
    }
    PushManager.prototype.subscribe = () => {
      isSubscribed = true
      sessionStorage.setItem('subscribed', 'yes')
      return Promise.resolve(subscription as unknown as PushSubscription)
    }
    PushManager.prototype.getSubscription = () =>
      Promise.resolve(isSubscribed ? (subscription as unknown as PushSubscription) : null)
  }, device)

  await test.step('sign up and confirm the address', async () => {
    await page.goto('/sign-up')
    await expectAccessible(page)
    await page.getByLabel('Name').fill('Runa Frost')
    await page.getByLabel('E-mail').fill(address)
    await page.getByLabel('Password').fill(PASSWORD)
    await page.getByRole('button', { name: 'Sign up' }).click()
    await expect(page.getByRole('heading', { name: /mail/i })).toBeVisible()
    const mail = await mailTo(address, /Confirm your e-mail address/)
    await page.goto(linkIn(mail.text, '/verify'))
    await expectAccessible(page)
    await page.getByRole('button', { name: /Confirm/ }).click()
    await expect(page).toHaveURL(/\/rinks\/new/)
  })

  await test.step('set up the rink', async () => {
    await expectAccessible(page)
    await page.getByLabel('Name', { exact: true }).fill('Alder Court')
    await page.getByText('Coordinates and time zone').click()
    await page.getByLabel('Latitude').fill('95')
    await page.getByLabel('Longitude').fill(String(place.longitudeDeg))
    await page.getByText('Ice to skate on').or(page.getByLabel('What is there now?')).first().waitFor()
    await page.getByLabel('What is there now?').selectOption('skating')
    await page.getByLabel('Ice thickness').fill('9')
    await page.getByRole('button', { name: 'Set up this rink' }).click()
    await expect(page.getByText(/-90|90/).first()).toBeVisible()
    await page.getByLabel('Latitude').fill(String(place.latitudeDeg))
    await page.getByLabel('Until').first().fill('01:00')
    await page.getByRole('button', { name: 'Set up this rink' }).click()
    await expect(page).toHaveURL(/\/alerts\/this-device/)
  })

  await test.step('let this device be told', async () => {
    await expectAccessible(page)
    await page.getByRole('button', { name: /Tell me|Allow|Notify/ }).click()
    await expect(page).toHaveURL(/\/rinks\/[0-9a-f-]{36}$/)
  })

  await test.step('see tonight', async () => {
    await expect(page.getByRole('heading', { level: 1, name: /Flood (tonight|this)/ })).toBeVisible({ timeout: 45_000 })
    await expect(page.getByRole('listitem').filter({ hasText: 'over the whole sheet' })).not.toHaveCount(0)
    await page.getByText('Show as table').first().click()
    await expect(page.getByRole('table').first().getByRole('row')).toHaveCount(25)
    await expectAccessible(page)
  })

  await test.step('receive the mail', async () => {
    const mail = await mailTo(address, /Alder Court: Flood/)
    expect(mail.text).toContain('Open the night sheet')
    expect(await mailCount(address, /Alder Court: Flood/)).toBe(1)
  })

  await test.step('receive the push in the service worker', async () => {
    const payload = await pushTo(device.id)
    expect(JSON.parse(payload)).toMatchObject({ body: expect.stringMatching(/Flood/) })
    const client = await context.newCDPSession(page)
    const registration = new Promise<string>((resolve) => {
      client.on('ServiceWorker.workerRegistrationUpdated', ({ registrations }) => {
        const [first] = registrations
        if (first) resolve(first.registrationId)
      })
    })
    await client.send('ServiceWorker.enable')
    await client.send('ServiceWorker.deliverPushMessage', {
      origin: baseURL ?? '',
      registrationId: await registration,
      data: payload,
    })
    const shown = () =>
      page.evaluate(async () => {
        const { ready } = navigator.serviceWorker
        const notifications = await (await ready).getNotifications()
        return notifications.map(({ title, data }) => ({ title, url: (data as { url?: string } | null)?.url }))
      })
    await expect.poll(shown).toEqual([{ title: 'Alder Court tonight', url: page.url() }])
  })

  await test.step('check a pass off and take it back', async () => {
    const check = page.getByRole('button', { name: 'Pass 1 is poured' })
    await check.click()
    await expect(page.getByText(/poured by Runa Frost/)).toBeVisible({ timeout: 20_000 })
    await page.getByRole('button', { name: 'Pass 1 is poured' }).click()
    await expect(page.getByText(/poured by Runa Frost/)).toBeHidden({ timeout: 20_000 })
  })

  await test.step('mute and unmute', async () => {
    // It shows before the server has it; who leaves sooner takes it along.
    const kept = page.waitForResponse((response) => (response.request().postData() ?? '').includes('until'))
    await page.getByRole('button', { name: 'Mute for tonight' }).click()
    await expect(page.getByText('Alerts are silent tonight.')).toBeVisible()
    await kept
    await page.reload()
    await expect(page.getByText('Alerts are silent tonight.')).toBeVisible()
    await page.getByRole('button', { name: 'Unmute' }).click()
    await expect(page.getByRole('button', { name: 'Mute for tonight' })).toBeVisible()
  })

  await test.step('the alerts and settings pages', async () => {
    const rinkUrl = page.url()
    await page.goto(`${rinkUrl}/alerts`)
    await expect(page.getByLabel('Tell me at')).toHaveValue('15:30')
    await expectAccessible(page)
    await page.goto(`${rinkUrl}/settings/place`)
    await expect(page.getByLabel('Name', { exact: true })).toHaveValue('Alder Court')
    await expectAccessible(page)
    await page.goto('/account')
    await expectAccessible(page)
  })

  await test.step('unsubscribe from the mail with one click, signed out', async () => {
    const mail = await mailTo(address, /Alder Court: Flood/)
    const link = linkIn(mail.text, '/api/unsubscribe')
    await context.clearCookies()
    await page.goto(link)
    await page.getByRole('button').first().click()
    await expect(page.getByText(/no more|stopped|off/i).first()).toBeVisible()
    const again = await fetch(link, {
      method: 'POST',
      headers: { 'content-type': 'application/x-www-form-urlencoded' },
      body: 'List-Unsubscribe=One-Click',
    })
    expect(again.ok).toBe(true)
  })
})
