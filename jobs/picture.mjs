// `npm run picture`: the README's picture, made from the running product: the first rink of the demo that floods tonight.
import { chromium } from '@playwright/test'

const address = process.env.PUBLIC_URL ?? 'http://localhost:3200'
const FILE = 'public/tonight.png'

const browser = await chromium.launch({
  executablePath: '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-dev-shm-usage', '--disable-gpu'],
})
const page = await browser.newPage({ viewport: { width: 1280, height: 1010 }, colorScheme: 'light', locale: 'en-CA' })
await page.goto(`${address}/sign-in`)
await page.getByLabel('E-mail').fill('maren@nightsheet.example')
await page.getByLabel('Password').fill('hose-before-midnight')
await page.getByRole('button', { name: 'Sign in', exact: true }).click()
await page.waitForURL(/\/rinks/)
const rinks = await page.locator('main a[href^="/rinks/"]').evaluateAll((links) => links.map((link) => link.href))
for (const rink of rinks.filter((href) => /[0-9a-f-]{36}$/.test(href))) {
  await page.goto(rink)
  const verdict = await page.getByRole('heading', { level: 1 }).textContent()
  if (!verdict?.startsWith('Flood')) continue
  await page.waitForLoadState('networkidle')
  await page.screenshot({ path: FILE })
  console.log(`${FILE}: ${verdict}`)
  break
}
await browser.close()
