// Setting a rink up as a person does it: in few touches, every key press counted.
import { randomUUID } from 'node:crypto'
import { expect, linkIn, mailTo, test } from './fixtures'
import { Typist } from './person'

const MOST_INTERACTIONS = 40

test('a rink is set up in under forty taps and key presses', async ({ page }, info) => {
  const address = `few-${randomUUID().slice(0, 8)}@nightsheet.example`
  await page.goto('/sign-up')
  await page.getByLabel('Name').fill('Few Taps')
  await page.getByLabel('E-mail').fill(address)
  await page.getByLabel('Password').fill('a hose in the snow 42')
  await page.getByRole('button', { name: 'Sign up' }).click()
  await page.goto(linkIn((await mailTo(address, /Confirm/)).text, '/verify'))
  await page.getByRole('button', { name: /Confirm/ }).click()
  await expect(page).toHaveURL(/\/rinks\/new/)

  const person = new Typist()
  const begun = Date.now()
  await person.type(page.getByLabel('Name', { exact: true }), 'Our yard')
  await person.type(page.getByLabel('Town or village'), 'pembroke')
  await person.tap(page.getByRole('list', { name: 'Places found' }).getByRole('button').first())
  await person.choose(page.getByLabel('What is there now?'), 'skating')
  await person.type(page.getByLabel('Ice thickness'), '9')
  await person.tap(page.getByRole('button', { name: 'Set up this rink' }))
  await expect(page).toHaveURL(/\/alerts\/this-device/)
  const seconds = ((Date.now() - begun) / 1000).toFixed(1)
  info.annotations.push({ type: 'set-up', description: `${person.interactions} interactions, ${seconds} s` })
  expect(person.interactions).toBeLessThan(MOST_INTERACTIONS)
})
