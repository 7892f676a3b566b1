// `npm run measure`: Lighthouse (mobile) on the pages people wait for, and how much script each loads first.
import lighthouse from 'lighthouse'
import { address, findLoggedRink, openBrowser, signIn } from './browser.mjs'

const PORT = 9333
const CATEGORIES = ['performance', 'accessibility', 'best-practices']
/** A page without a single client component: what every route of this build loads. */
const EMPTY = '/help/cautions'

/** Bytes of script over the wire in a fresh visit, compressed as served. */
async function scriptBytes(browser, url, state) {
  const context = await browser.newContext({ storageState: state, serviceWorkers: 'block' })
  const page = await context.newPage()
  const client = await context.newCDPSession(page)
  await client.send('Network.enable')
  const scripts = new Set()
  let bytes = 0
  client.on('Network.responseReceived', ({ requestId, type }) => type === 'Script' && scripts.add(requestId))
  client.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
    if (scripts.has(requestId)) bytes += encodedDataLength
  })
  // What is loaded before anybody has touched or scrolled the page.
  await page.goto(url, { waitUntil: 'networkidle' })
  await context.close()
  return bytes
}

const browser = await openBrowser([`--remote-debugging-port=${PORT}`])
const context = await browser.newContext()
const page = await context.newPage()
await signIn(page)
const tonight = await findLoggedRink(page)
const state = await context.storageState()
const cookie = state.cookies.map(({ name, value }) => `${name}=${value}`).join('; ')

const pages = { Tonight: tonight, Week: `${tonight}/week`, Front: `${address}/` }
for (const [name, url] of Object.entries(pages)) {
  const extraHeaders = name === 'Front' ? {} : { Cookie: cookie }
  const { lhr } = await lighthouse(url, { port: PORT, onlyCategories: CATEGORIES, extraHeaders, logLevel: 'error' })
  const scores = CATEGORIES.map((one) => `${one} ${Math.round(lhr.categories[one].score * 100)}`)
  const missed = Object.values(lhr.audits).filter(
    ({ id, score }) => score !== null && score < 0.9 && CATEGORIES.some((one) => isWeighed(lhr, one, id)),
  )
  console.log(`${name.padEnd(8)} ${scores.join(', ')}`)
  for (const { id, displayValue } of missed) console.log(`         below 0.9: ${id} ${displayValue ?? ''}`)
}

function isWeighed(lhr, category, id) {
  return lhr.categories[category].auditRefs.some((ref) => ref.id === id && ref.weight > 0)
}

const empty = await scriptBytes(browser, address + EMPTY, state)
console.log(`Script   ${EMPTY} ${(empty / 1024).toFixed(1)} KiB`)
for (const [name, url] of Object.entries(pages)) {
  const bytes = await scriptBytes(browser, url, state)
  console.log(`Script   ${name} ${(bytes / 1024).toFixed(1)} KiB, ${(bytes / empty).toFixed(2)} times the empty route`)
}
await browser.close()
