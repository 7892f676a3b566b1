// An evening's work with the plan: a pass moved and kept, hours opened by keys, a check-off without a network sent once.
import type { Page } from '@playwright/test'
import { seedTheDemo, signInAsKeeper } from './demo'
import { expect, expectAccessible, test } from './fixtures'

test.beforeAll(seedTheDemo)

/** A rink of the demo with passes planned: there is one at any hour. */
async function openPlannedRink(page: Page): Promise<void> {
  await expect(async () => {
    await page.goto('/rinks')
    await page
      .getByRole('link', { name: /Flood .* passes/ })
      .last()
      .click({ timeout: 3000 })
  }).toPass({ timeout: 90_000 })
  await expect(page.getByRole('button', { name: 'Change the plan' })).toBeVisible()
}

const passRow = (page: Page, number: number) =>
  page.getByRole('listitem').filter({ has: page.getByRole('button', { name: `Pass ${number} is poured` }) })

/** The pass that is open to change. */
const firstOpen = (page: Page) =>
  page.getByRole('listitem').filter({ has: page.getByRole('group', { name: /^Change pass/ }) })

test('the keeper moves a pass, and the plan follows at once', async ({ page, context }) => {
  test.setTimeout(240_000)
  await signInAsKeeper(page)
  await openPlannedRink(page)

  await test.step('open the plan to change it', async () => {
    await page.getByRole('button', { name: 'Change the plan' }).click()
    await expect(page.getByRole('button', { name: 'Later', exact: true })).toBeVisible()
    await expectAccessible(page)
  })

  await test.step('every tap changes what the plan says, without asking the server', async () => {
    await context.setOffline(true)
    for (const name of ['Later', 'Thicker', 'Earlier', 'Thinner']) {
      const before = await firstOpen(page).textContent()
      await page.getByRole('button', { name, exact: true }).click()
      await expect(firstOpen(page)).not.toHaveText(before ?? '')
    }
    await context.setOffline(false)
  })

  await test.step('a pass that is checked off meanwhile counts at once, and can be taken back', async () => {
    const check = page.getByRole('button', { name: 'Pass 1 is poured' })
    await page.getByRole('button', { name: 'Later', exact: true }).click()
    await check.click()
    await expect(page.getByText(/poured by Maren/)).toHaveCount(1)
    await check.click()
    await expect(page.getByText(/poured by Maren/)).toBeHidden()
  })

  await test.step('keep it, with hot water', async () => {
    await page.getByText(/Hot tap/).click()
    await page.getByRole('button', { name: 'Keep this plan' }).click()
    await expect(page.getByText(/Changed by Maren/)).toBeVisible({ timeout: 20_000 })
    await page.reload()
    await expect(passRow(page, 1)).toContainText('water at')
    await expectAccessible(page)
  })

  await test.step('back to the advised plan', async () => {
    await page.getByRole('button', { name: 'Back to the advised plan' }).click()
    await expect(page.getByText(/Changed by Maren/)).toBeHidden({ timeout: 20_000 })
    await expect(passRow(page, 1)).not.toContainText('water at')
  })
})

test('hours of the strip open by keys', async ({ page }) => {
  await signInAsKeeper(page)
  await openPlannedRink(page)
  const hours = page.getByRole('listbox', { name: 'Hours of the night' }).and(page.locator(':visible'))
  const opened = page.getByRole('heading', { level: 2, name: /, (flood|fill|hold off)/ })
  const chosen = hours.locator('[aria-selected=true]')
  await hours.locator('[tabindex="0"]').focus()
  await page.keyboard.press('Enter')
  await expect(opened).toBeVisible()
  await page.keyboard.press('Home')
  await expect(chosen).toHaveAccessibleName('noon')
  await page.keyboard.press('ArrowRight')
  await expect(chosen).toHaveAccessibleName('1 pm')
  await page.keyboard.press('End')
  await expect(chosen).toHaveAccessibleName('11 am')
  await page.keyboard.press('ArrowLeft')
  await expect(chosen).toHaveAccessibleName('10 am')
  await expect(page.getByText('In all')).toBeVisible()
  await page.keyboard.press('Escape')
  await expect(opened).toBeHidden()
})

test('a check-off without a network waits on the phone, and is sent once', async ({ page, context }) => {
  test.setTimeout(240_000)
  await signInAsKeeper(page)
  await openPlannedRink(page)
  const check = page.getByRole('button', { name: 'Pass 1 is poured' })

  await test.step('the service worker has the sheet', async () => {
    await page.evaluate(async () => void (await navigator.serviceWorker.ready))
    await page.reload()
    const kept = () =>
      page.evaluate(async () => (await (await caches.open('night-sheets-1')).match(location.pathname)) !== undefined)
    await expect.poll(kept, { timeout: 20_000 }).toBe(true)
    await page.reload()
  })

  await test.step('check off offline, and read the sheet again', async () => {
    await context.setOffline(true)
    await check.click()
    await expect(check).toHaveAttribute('aria-pressed', 'true')
    await expect(page.getByText('Waiting to be sent from this device.')).toBeVisible()
    await page.reload()
    await expect(page.getByText(/No connection/)).toBeVisible()
    await expect(page.getByText('Waiting to be sent from this device.')).toBeVisible()
  })

  await test.step('a chart that cannot be fetched leaves the rest of the sheet alone', async () => {
    await page.getByRole('heading', { name: 'The days ahead' }).scrollIntoViewIfNeeded()
    await expect(page.getByText(/The chart could not be fetched/)).toBeVisible()
    await expect(check).toBeVisible()
  })

  await test.step('it is sent when the network is back', async () => {
    await context.setOffline(false)
    await expect(page.getByText(/poured by Maren/)).toHaveCount(1, { timeout: 30_000 })
    await expect(page.getByText('Waiting to be sent from this device.')).toBeHidden()
    await page.reload()
    await expect(page.getByText(/poured by Maren/)).toHaveCount(1)
    // In daylight a pass may not set within the forecast: then no time is promised.
    await expect(passRow(page, 1)).toContainText(/Keep off/)
  })

  await test.step('and taken back', async () => {
    await check.click()
    await expect(page.getByText(/poured by Maren/)).toBeHidden({ timeout: 20_000 })
  })

  await test.step('also from the copy for when there is no network', async () => {
    const copy = () =>
      page.evaluate(async () => (await (await caches.open('night-sheets-1')).match(location.pathname))?.text())
    await expect.poll(copy, { timeout: 20_000 }).not.toMatch(/poured by/)
    await context.setOffline(true)
    await page.reload()
    await expect(page.getByText(/No connection/)).toBeVisible()
    await expect(check).toHaveAttribute('aria-pressed', 'false')
    await context.setOffline(false)
  })

  await test.step('whoever signs in next finds nothing kept', async () => {
    await page.goto('/sign-out')
    await page.getByRole('button', { name: 'Sign out' }).click()
    await expect(page).toHaveURL(/\/$/)
    const kept = () => page.evaluate(async () => (await (await caches.open('night-sheets-1')).keys()).length)
    await expect.poll(kept).toBe(0)
  })
})
