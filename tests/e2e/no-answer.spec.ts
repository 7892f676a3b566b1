// Forms on a line that fails: the page says so, what was typed stays, and sending it again works.
import { signInAsKeeper, seedTheDemo } from './demo'
import { expect, test } from './fixtures'

test.beforeAll(seedTheDemo)

test('a form without an answer keeps what was typed', async ({ page, context }) => {
  await signInAsKeeper(page)
  await page.goto('/account')
  await page.waitForLoadState('networkidle')
  const name = page.getByLabel('Name', { exact: true })
  await name.fill('Maren at the rink')
  await page.getByLabel('Clock').selectOption('24')
  await context.setOffline(true)
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect(page.getByText(/There was no answer from the server/)).toBeVisible()
  await expect(name).toHaveValue('Maren at the rink')
  await expect(page.getByLabel('Clock')).toHaveValue('24')
  await context.setOffline(false)
  await name.fill('Maren')
  await page.getByLabel('Clock').selectOption('12')
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect(page.getByText('Saved.')).toBeVisible()
})

test('setting up a rink survives a line that fails', async ({ page, context }) => {
  await signInAsKeeper(page)
  await page.goto('/rinks/new')
  await page.waitForLoadState('networkidle')
  await page.getByLabel('Name', { exact: true }).fill('Behind the barn')
  await context.setOffline(true)
  await page.getByRole('button', { name: 'Set up this rink' }).click()
  await expect(page.getByText(/There was no answer from the server/)).toBeVisible()
  await expect(page.getByLabel('Name', { exact: true })).toHaveValue('Behind the barn')
})
