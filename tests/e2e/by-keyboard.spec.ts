// An evening with a keyboard and nothing else, on a desk at 200 % zoom: 1280 by 800 pixels become 640 by 400.
import { forgetEntriesSince, openBirchLane, seedTheDemo } from './demo'
import { expect, test } from './fixtures'
import { press, tabTo } from './person'

test.use({ viewport: { width: 640, height: 400 } })
let seededAt = new Date()
test.beforeAll(async () => {
  await seedTheDemo()
  seededAt = new Date()
})
test.afterAll(() => forgetEntriesSince(seededAt))

test('sign in, read the night, check off, log, mute, and change a setting, by keyboard at 200 % zoom', async ({
  page,
}) => {
  test.setTimeout(300_000)
  const keys = page.keyboard

  await test.step('sign in', async () => {
    await page.goto('/sign-in')
    await tabTo(page, page.getByLabel('E-mail'))
    await keys.type('maren@nightsheet.example')
    await tabTo(page, page.getByLabel('Password'))
    await keys.type('hose-before-midnight')
    await keys.press('Enter')
    await expect(page).toHaveURL(/\/rinks/)
  })
  const rink = await openBirchLane(page)

  await test.step('open an hour, and the table', async () => {
    await press(page, page.getByRole('listbox', { name: 'Hours of the night' }).locator('[tabindex="0"]:visible'))
    await expect(page.getByText('In all')).toBeVisible()
    await keys.press('Escape')
    await press(page, page.getByText('Show as table').first())
    await expect(page.getByRole('table').first()).toBeVisible()
  })

  await test.step('mute and unmute', async () => {
    await press(page, page.getByRole('button', { name: 'Mute for tonight' }))
    await expect(page.getByText('Alerts are silent tonight.')).toBeVisible()
    await press(page, page.getByRole('button', { name: 'Unmute' }))
    await expect(page.getByRole('button', { name: 'Mute for tonight' })).toBeVisible()
  })

  await test.step('log a flood', async () => {
    await press(page, page.getByRole('link', { name: 'Log', exact: true }))
    await expect(page).toHaveURL(`${rink}/log`)
    await press(page, page.getByRole('button', { name: 'Flood', exact: true }))
    await press(page, page.getByRole('button', { name: 'Log this flood' }))
    await expect(page.getByText(/Flood.*just now|Logged|in the log/i).first()).toBeVisible()
  })

  await test.step('open a night of the week', async () => {
    await press(page, page.getByRole('link', { name: 'Week', exact: true }))
    await expect(page).toHaveURL(`${rink}/week`)
    await press(page, page.locator('main a[href*="night="]').first())
    await expect(page).toHaveURL(/night=/)
  })

  await test.step('change the yard', async () => {
    await press(page, page.getByRole('link', { name: 'More', exact: true }))
    await press(page, page.getByRole('link', { name: /Rink settings/ }))
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
    await press(page, page.locator(`main a[href="${rink}/settings/yard"]`))
    await tabTo(page, page.getByRole('radio', { checked: true }).first())
    await keys.press('ArrowDown')
    await press(page, page.getByRole('button', { name: /Save/ }))
    await expect(page.getByRole('status').filter({ hasText: /Saved/ }).first()).toBeVisible()
  })
})
