// Sharing a rink: the keeper invites, the invited signs up in a browser of their own and floods along; a stranger sees nothing.
import { randomUUID } from 'node:crypto'
import { openBirchLane, seedTheDemo, signInAsKeeper } from './demo'
import { expect, expectAccessible, linkIn, mailTo, test } from './fixtures'

test.beforeAll(seedTheDemo)

test('a keeper invites somebody, who signs up, joins and sees tonight as crew', async ({ page, browser }) => {
  test.setTimeout(240_000)
  const address = `invited-${randomUUID().slice(0, 8)}@nightsheet.example`
  const name = `Nils ${randomUUID().slice(0, 4)}`
  const context = await browser.newContext()
  const theirs = await context.newPage()
  let people = ''

  await test.step('the keeper invites an address as crew', async () => {
    await signInAsKeeper(page)
    await page.goto(`${await openBirchLane(page)}/more`)
    await page.getByRole('link', { name: /^People/ }).click()
    await expect(page.getByRole('heading', { level: 1, name: 'People' })).toBeVisible()
    people = new URL(page.url()).pathname
    await page.getByLabel('E-mail').fill('nobody')
    await page.getByRole('button', { name: 'Send the invitation' }).click()
    await expect(page.getByText('does not look like an e-mail address')).toBeVisible()
    await page.getByLabel('E-mail').fill(address)
    await page.getByRole('button', { name: 'Send the invitation' }).click()
    await expect(page.getByText(`An invitation is on its way to ${address}`)).toBeVisible()
    await expect(page.getByRole('button', { name: `Take back from ${address}` })).toBeVisible()
    await expectAccessible(page)
  })

  await test.step('the invited finds the rink closed, and the invitation open', async () => {
    await theirs.goto(linkIn((await mailTo(address, /Maren Holt invites you to Birch Lane/)).text, '/invitation'))
    await expect(theirs.getByRole('heading', { level: 1, name: 'Join Birch Lane?' })).toBeVisible()
    await expectAccessible(theirs)
    await theirs.getByRole('link', { name: 'Sign up' }).click()
  })

  await test.step('they sign up, and come back to the invitation', async () => {
    await theirs.getByLabel('Name').fill(name)
    await theirs.getByLabel('E-mail').fill(address)
    await theirs.getByLabel('Password').fill('a hose in the snow 42')
    await theirs.getByRole('button', { name: 'Sign up' }).click()
    await theirs.goto(linkIn((await mailTo(address, /Confirm/)).text, '/verify'))
    await theirs.getByRole('button', { name: /Confirm/ }).click()
    await expect(theirs).toHaveURL(/\/invitation\?key=/)
    expect((await theirs.goto(people))?.status(), 'not on the rink yet').toBe(404)
    await theirs.goBack()
    await expectAccessible(theirs)
  })

  await test.step('they join, and see tonight as crew', async () => {
    const invitation = theirs.url()
    await theirs.getByRole('button', { name: `Join as ${name}` }).click()
    await expect(theirs).toHaveURL(/\/rinks\/[0-9a-f-]{36}$/)
    await expect(theirs.getByRole('heading', { level: 1 })).toHaveText(/Flood|Hold|Fill/)
    await expect(theirs.getByRole('button', { name: 'Mute for tonight' }), 'crew are told').toBeVisible()
    await theirs.goto(invitation)
    await expect(theirs.getByText('You are on it as crew.')).toBeVisible()
    await theirs.goto(people)
    await expect(theirs.getByText(`${name} (you)`)).toBeVisible()
    await expect(theirs.getByLabel('E-mail')).toHaveCount(0)
    await expectAccessible(theirs)
  })

  await test.step('the keeper makes them a skater, and takes them off', async () => {
    await page.reload()
    await expect(page.getByText(address)).toHaveCount(0)
    await page.getByText(name, { exact: true }).click()
    const theirRow = page.getByRole('group').filter({ has: page.getByRole('button', { name: `Save what ${name} is` }) })
    await theirRow.getByLabel('Skater').check()
    await page.getByRole('button', { name: `Save what ${name} is` }).click()
    await expect(theirRow.getByText('Saved.')).toBeVisible()
    await expectAccessible(page)
    await page.getByRole('button', { name: `Take ${name} off the rink` }).click()
    await expect(page.getByText(name)).toHaveCount(0)
    expect((await theirs.goto(people))?.status(), 'on the rink no more').toBe(404)
  })
  await context.close()
})
