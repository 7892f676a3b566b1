// Who gets in and who does not: strangers, wrong passwords, forged and used links, the front page for everybody.
import { randomUUID } from 'node:crypto'
import { expect, expectAccessible, linkIn, mailTo, test } from './fixtures'

test('the front page and the page on how it works are for everybody', async ({ page }) => {
  await page.goto('/')
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
  await expectAccessible(page)
  await page.goto('/how-it-works')
  await expectAccessible(page)
})

test('a stranger is sent to sign-in and comes back afterwards', async ({ page }) => {
  await page.goto('/rinks/new')
  await expect(page).toHaveURL(/\/sign-in/)
  await expectAccessible(page)
})

test('a wrong password and an unknown address are refused in the same words', async ({ page }) => {
  const refusals: string[] = []
  for (const email of ['nobody@nightsheet.example', `other-${randomUUID().slice(0, 8)}@nightsheet.example`]) {
    await page.goto('/sign-in')
    await page.getByLabel('E-mail').fill(email)
    await page.getByLabel('Password').fill('not the password')
    await page.getByRole('button', { name: 'Sign in' }).click()
    const refusal = page.getByRole('status').or(page.getByRole('alert')).filter({ hasText: /\w/ }).first()
    await expect(refusal).toBeVisible()
    refusals.push((await refusal.textContent()) ?? '')
  }
  expect(refusals[0]).toBe(refusals[1])
})

test('a link signs in once, and a forged one not at all', async ({ page }) => {
  const address = `link-${randomUUID().slice(0, 8)}@nightsheet.example`
  await page.goto('/sign-up')
  await page.getByLabel('Name').fill('Once Only')
  await page.getByLabel('E-mail').fill(address)
  await page.getByLabel('Password').fill('a hose in the snow 42')
  await page.getByRole('button', { name: 'Sign up' }).click()
  const link = linkIn((await mailTo(address, /Confirm/)).text, '/verify')
  await page.goto(`${link.slice(0, -4)}AAAA`)
  await expect(page.getByRole('button', { name: /Confirm/ })).toHaveCount(0)
  await page.goto(link)
  await page.getByRole('button', { name: /Confirm/ }).click()
  await expect(page).toHaveURL(/\/rinks/)
  await page.context().clearCookies()
  await page.goto(link)
  await expect(page.getByRole('button', { name: /Confirm/ })).toHaveCount(0)
})

test('a rink that does not exist answers 404, with words', async ({ page, request }) => {
  const address = `lost-${randomUUID().slice(0, 8)}@nightsheet.example`
  await page.goto('/sign-up')
  await page.getByLabel('Name').fill('Lost Person')
  await page.getByLabel('E-mail').fill(address)
  await page.getByLabel('Password').fill('a hose in the snow 42')
  await page.getByRole('button', { name: 'Sign up' }).click()
  await page.goto(linkIn((await mailTo(address, /Confirm/)).text, '/verify'))
  await page.getByRole('button', { name: /Confirm/ }).click()
  await expect(page).toHaveURL(/\/rinks/)
  const response = await page.goto(`/rinks/${randomUUID()}`)
  expect(response?.status()).toBe(404)
  await expectAccessible(page)
  const health = await request.get('/api/health')
  expect(await health.json()).toMatchObject({ workers: 1 })
})
