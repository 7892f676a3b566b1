// From the first water to the first skater: a fill started, looked at, paused, gone on and finished; a hole drilled; opened.
import { seedTheDemo, signInAsKeeper } from './demo'
import { expect, expectAccessible, test } from './fixtures'

test.beforeAll(seedTheDemo)

test('the keeper fills a rink, lets it freeze and opens it', async ({ page }) => {
  test.setTimeout(240_000)
  await signInAsKeeper(page)
  await page.goto('/rinks')
  await page.getByRole('link', { name: /New Boards/ }).click()
  await expect(page).toHaveURL(/\/rinks\/[0-9a-f-]{36}$/)
  const rink = new URL(page.url()).pathname
  const title = page.getByRole('heading', { level: 1 })

  await test.step('start the fill, with a flow that makes sense', async () => {
    await page.goto(`${rink}/filling`)
    await page.getByLabel('Flow').fill('a bucket')
    await page.getByRole('button', { name: 'The hose runs: start' }).click()
    await expect(page.getByText('Type a number here.')).toBeVisible()
    await page.getByLabel('Flow').fill('40')
    await page.getByRole('button', { name: 'The hose runs: start' }).click()
    await expect(title).toHaveText(/ in, .* of the fill\. Done by/)
    await expectAccessible(page)
  })

  await test.step('log a look', async () => {
    await page.getByLabel('What you saw').fill('Liner lies flat')
    await page.getByRole('button', { name: 'Log this look' }).click()
    await expect(page.getByText('Liner lies flat')).toBeVisible()
  })

  await test.step('pause, and go on', async () => {
    await page.getByRole('button', { name: 'Hose off: pause' }).click()
    await expect(title).toHaveText(/of hose to go/)
    await expectAccessible(page)
    await page.getByRole('button', { name: 'The hose runs: go on' }).click()
    await expect(title).toHaveText(/Done by/)
  })

  await test.step('finish it, after a word about what is missing', async () => {
    await page.getByText('The water is in: finish').click()
    await expect(page.getByText(/of the fill are not in yet/)).toBeVisible()
    await page.getByRole('button', { name: 'Finish the fill' }).click()
    await expect(title).toHaveText('The water is in.')
    await page.getByRole('link', { name: 'How thick is it' }).click()
    await expect(title).toHaveText(/^No ice yet on/)
    await expect(page.getByText('Keep off: thin ice')).toBeVisible()
    await expectAccessible(page)
  })

  await test.step('a thin hole opens nothing, a thick one does', async () => {
    await page.getByLabel('Ice in a hole drilled now').fill('4')
    await page.getByRole('button', { name: 'Log this hole' }).click()
    await expect(title).toHaveText(/^4\.0\scm of ice/)
    await expect(page.getByText('Open for skating')).toBeHidden()
    await page.reload()
    await page.getByLabel('Ice in a hole drilled now').fill('11')
    await page.getByRole('button', { name: 'Log this hole' }).click()
    await expect(title).toHaveText(/^11\.0\scm of ice/)
    await page.getByText('Open for skating').click()
    await page.getByRole('button', { name: 'Open the rink' }).click()
    await expect(async () => {
      await page.goto(rink)
      await expect(title).toHaveText(/Flood|Hold off/, { timeout: 2000 })
      await expect(page.getByText('Freezing', { exact: false })).toBeHidden({ timeout: 1000 })
    }).toPass({ timeout: 60_000 })
  })
})
