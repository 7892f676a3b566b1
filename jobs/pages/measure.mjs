// `npm run measure`: Lighthouse (mobile) on the pages people wait for, how much script each loads first, and how soon a tap
// shows a changed plan.
import lighthouse, { defaultConfig } from 'lighthouse'
import { address, findLoggedRink, listRinks, openBrowser, signIn } from './browser.mjs'

const PORT = 9333
const TAPS = ['Later', 'Thicker', 'Later', 'Thinner', 'Earlier', 'Earlier', 'Later', 'Thicker', 'Thinner']
const CATEGORIES = ['performance', 'accessibility', 'best-practices']
const MOBILE = defaultConfig.settings.throttling
/** Middle of its bracket in Lighthouse's docs/throttling.md, which asks to calibrate the slow-down on slower machines. */
const HIGH_END_DESKTOP_INDEX = 1750
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

/** The first rink of the list with passes planned tonight; the demo has one at any hour. */
async function findPlannedRink(page) {
  for (const rink of await listRinks(page)) {
    await page.goto(rink)
    if (await page.getByRole('button', { name: 'Change the plan' }).isVisible()) return rink
  }
  throw new Error('No rink of the demo has a plan tonight.')
}

/** Milliseconds from a click in the open pass until its row reads differently and is painted, on a phone four times slower. */
async function tapTimes(browser, rink, state) {
  const context = await browser.newContext({ storageState: state, viewport: { width: 390, height: 844 } })
  const page = await context.newPage()
  await page.goto(rink, { waitUntil: 'networkidle' })
  await page.getByRole('button', { name: 'Change the plan' }).click()
  await page.getByRole('button', { name: 'Later', exact: true }).waitFor()
  const client = await context.newCDPSession(page)
  await client.send('Emulation.setCPUThrottlingRate', { rate: 4 })
  const times = []
  for (const name of TAPS) times.push(await page.evaluate(tapToPaint, name))
  await context.close()
  return times
}

/** Runs in the page. */
async function tapToPaint(name) {
  const group = document.querySelector('[role=group][aria-label^="Change pass"]')
  const row = group.closest('li')
  const button = [...group.querySelectorAll('button')].find((one) => one.textContent.trim() === name)
  const before = row.textContent
  const start = performance.now()
  button.click()
  while (row.textContent === before) await new Promise((resolve) => setTimeout(resolve, 0))
  await new Promise((resolve) => requestAnimationFrame(() => setTimeout(resolve, 0)))
  return performance.now() - start
}

const browser = await openBrowser([`--remote-debugging-port=${PORT}`])
const context = await browser.newContext()
const page = await context.newPage()
await signIn(page)
const tonight = await findLoggedRink(page)
const state = await context.storageState()
const cookie = state.cookies.map(({ name, value }) => `${name}=${value}`).join('; ')

const pages = { Tonight: tonight, Week: `${tonight}/week`, Front: `${address}/` }
for (const [name, url] of Object.entries({ ...pages, Empty: address + EMPTY })) {
  const extraHeaders = name === 'Front' ? {} : { Cookie: cookie }
  const look = async (cpuSlowdownMultiplier) => {
    const flags = { port: PORT, onlyCategories: CATEGORIES, extraHeaders, logLevel: 'error' }
    return (await lighthouse(url, { ...flags, throttling: { ...MOBILE, cpuSlowdownMultiplier } })).lhr
  }
  const usual = await look(MOBILE.cpuSlowdownMultiplier)
  report(name, usual)
  report('', await look(sameSlowness(usual.environment.benchmarkIndex)))
}

function report(name, lhr) {
  const scores = CATEGORIES.map((one) => `${one} ${Math.round(lhr.categories[one].score * 100)}`)
  const { cpuSlowdownMultiplier } = lhr.configSettings.throttling
  const { benchmarkIndex } = lhr.environment
  console.log(`${name.padEnd(8)} ${scores.join(', ')} (index ${benchmarkIndex} slowed ${cpuSlowdownMultiplier} times)`)
  const missed = Object.values(lhr.audits).filter(
    ({ id, score }) => score !== null && score < 0.9 && CATEGORIES.some((one) => isWeighed(lhr, one, id)),
  )
  for (const { id, displayValue } of missed) console.log(`         below 0.9: ${id} ${displayValue ?? ''}`)
}

/** Lighthouse's fixed slow-down makes a mid-tier phone of a high-end desktop; this one makes the same phone of this machine. */
function sameSlowness(benchmarkIndex) {
  const slowness = (MOBILE.cpuSlowdownMultiplier * benchmarkIndex) / HIGH_END_DESKTOP_INDEX
  return Number(Math.max(1, slowness).toFixed(1))
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

const taps = await tapTimes(browser, await findPlannedRink(page), state)
console.log(`Tap to changed plan at 4x CPU slow-down: ${taps.map((ms) => ms.toFixed(0)).join(' ')} ms`)
console.log(`         median ${taps.sort((a, b) => a - b)[Math.floor(taps.length / 2)].toFixed(0)} ms`)
await browser.close()
