// `npm run picture`: the README's picture, made from the running product: the first rink of the demo that floods tonight.
import { listRinks, openBrowser, signIn } from './browser.mjs'

const FILE = 'public/tonight.png'

const browser = await openBrowser()
const page = await browser.newPage({ viewport: { width: 1280, height: 1010 }, colorScheme: 'light', locale: 'en-CA' })
await signIn(page)
for (const rink of await listRinks(page)) {
  await page.goto(rink)
  const verdict = await page.getByRole('heading', { level: 1 }).textContent()
  if (!verdict?.startsWith('Flood')) continue
  await page.waitForLoadState('networkidle')
  await page.screenshot({ path: FILE })
  console.log(`${FILE}: ${verdict}`)
  break
}
await browser.close()
