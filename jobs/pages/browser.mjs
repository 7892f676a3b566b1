// Debian's Chromium and the demo's keeper, for the scripts that look at the running product.
import { chromium } from '@playwright/test'

export const address = process.env.PUBLIC_URL ?? 'http://localhost:3200'
const KEEPER = { email: 'maren@nightsheet.example', password: 'hose-before-midnight' }

/** Root may not use the sandbox, and /dev/shm is tiny in containers. */
export function openBrowser(args = []) {
  return chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-dev-shm-usage', '--disable-gpu', ...args],
  })
}

export async function signIn(page) {
  await page.goto(`${address}/sign-in`)
  await page.getByLabel('E-mail').fill(KEEPER.email)
  await page.getByLabel('Password').fill(KEEPER.password)
  await page.getByRole('button', { name: 'Sign in', exact: true }).click()
  await page.waitForURL(/\/rinks/)
}

/** Addresses of the keeper's rinks, in the order of the list; the page has to be signed in. */
export async function listRinks(page) {
  await page.goto(`${address}/rinks`)
  const links = await page.locator('main a[href^="/rinks/"]').evaluateAll((all) => all.map((link) => link.href))
  return [...new Set(links.filter((href) => /[0-9a-f-]{36}$/.test(href)))]
}

/** The rink whose log the demo has written. */
export async function findLoggedRink(page) {
  const rinks = await listRinks(page)
  for (const rink of rinks) {
    await page.goto(rink)
    if (await page.getByText('Birch Lane').first().isVisible()) return rink
  }
  return rinks[0]
}
