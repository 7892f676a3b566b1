// Every page, on a phone, on a desk and at 200 % zoom, light and dark: readable by everybody, never wider than the screen.
import type { Page } from '@playwright/test'
import { findLinkedPage, LINKED_PAGES, MEMBER_PAGES, OPEN_PAGES, RINK_PAGES } from '../../jobs/pages/list.mjs'
import { openBirchLane, seedTheDemo, signInAsKeeper } from './demo'
import { expect, expectAccessible, test } from './fixtures'

/** A desk of 1280 px at 200 % zoom has 640 px: there only the fit is looked at. */
const WIDTHS = [390, 640, 1280]
const ZOOMED = 640

test.beforeAll(seedTheDemo)

async function expectFit(page: Page, path: string): Promise<void> {
  const response = await page.goto(path)
  expect(response?.status(), path).toBe(200)
  await expect(page.getByRole('heading', { level: 1 }), path).not.toHaveCount(0)
  for (const width of WIDTHS) {
    await page.setViewportSize({ width, height: width === 390 ? 844 : 800 })
    const isTooWide = await page.evaluate(() => document.documentElement.scrollWidth > window.innerWidth)
    expect(isTooWide, `${path} is wider than ${width} px`).toBe(false)
    if (width !== ZOOMED) await expectAccessible(page)
  }
}

test('pages that need no account', async ({ page }) => {
  test.setTimeout(300_000)
  for (const path of Object.values(OPEN_PAGES)) await expectFit(page, path)
})

test('pages of a person and of a rink', async ({ page }) => {
  test.setTimeout(600_000)
  await signInAsKeeper(page)
  for (const path of Object.values(MEMBER_PAGES)) await expectFit(page, path)
  const rink = await openBirchLane(page)
  for (const path of Object.values(RINK_PAGES)) await expectFit(page, rink + path)
  for (const linked of Object.values(LINKED_PAGES)) {
    await expectFit(page, (await findLinkedPage(page, rink, linked)) ?? `no link ${linked.href}`)
  }
})
