// `npm run pictures`: every page of the running demo at both widths and in both themes, into .data/pictures.
import fs from 'node:fs'
import path from 'node:path'
import { address, findLoggedRink, listRinks, openBrowser, signIn } from './browser.mjs'
import { findLinkedPage, LINKED_PAGES, MEMBER_PAGES, OPEN_PAGES, RINK_PAGES } from './list.mjs'

const FOLDER = '.data/pictures'
const WIDTHS = { 390: 844, 1280: 900 }
const THEMES = ['light', 'dark']
const wanted = process.argv.slice(2)
const isWanted = ([name]) => wanted.length === 0 || wanted.includes(name)

/** Charts come once they are nearly in view. */
async function lookThrough(page) {
  await page.evaluate(() => scrollTo(0, document.body.scrollHeight))
  await page.waitForTimeout(300)
  await page.waitForLoadState('networkidle')
  await page.evaluate(() => scrollTo(0, 0))
}

async function picture(page, name, url) {
  for (const [width, height] of Object.entries(WIDTHS)) {
    await page.setViewportSize({ width: Number(width), height })
    for (const colorScheme of THEMES) {
      await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' })
      const response = await page.goto(url)
      await page.waitForLoadState('networkidle')
      await lookThrough(page)
      const file = path.join(FOLDER, `${name}-${width}-${colorScheme}.png`)
      await page.screenshot({ path: file, fullPage: true })
      const isTooWide = await page.evaluate(() => document.documentElement.scrollWidth > window.innerWidth)
      console.log(`${file}  ${response?.status()}${isTooWide ? '  WIDER THAN THE SCREEN' : ''}`)
    }
  }
}

fs.mkdirSync(FOLDER, { recursive: true })
const browser = await openBrowser()
const page = await browser.newPage({ locale: 'en-CA' })
for (const [name, where] of Object.entries(OPEN_PAGES).filter(isWanted)) await picture(page, name, address + where)
await signIn(page)
for (const [name, where] of Object.entries(MEMBER_PAGES).filter(isWanted)) await picture(page, name, address + where)
const rink = await findLoggedRink(page)
for (const [name, where] of Object.entries(RINK_PAGES).filter(isWanted)) await picture(page, name, rink + where)
for (const [name, linked] of Object.entries(LINKED_PAGES).filter(isWanted)) {
  await picture(page, name, await findLinkedPage(page, rink, linked))
}
// The same page says different things of a rink that waits, floods or thaws.
for (const [index, other] of (await listRinks(page)).entries()) {
  const name = `tonight-${index + 1}`
  if (other !== rink && isWanted([name])) await picture(page, name, other)
}
await browser.close()
