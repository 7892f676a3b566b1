// Somebody at a screen: taps and types a key at a time, and counts both; or has a keyboard and nothing else.
import type { Locator, Page } from '@playwright/test'
import { expect } from './fixtures'

/** Taps and key presses, counted one by one. */
export class Typist {
  interactions = 0

  async tap(target: Locator): Promise<void> {
    this.interactions += 1
    await target.click()
  }

  async type(target: Locator, text: string): Promise<void> {
    await this.tap(target)
    this.interactions += text.length
    await target.pressSequentially(text)
  }

  /** A list opens with one tap and closes with another. */
  async choose(target: Locator, value: string): Promise<void> {
    this.interactions += 2
    await target.selectOption(value)
  }
}

const MOST_TABS = 150

/** Goes to a control by Tab alone, and checks that its focus can be seen. */
export async function tabTo(page: Page, target: Locator): Promise<void> {
  await expect(target).toBeVisible()
  for (let tabs = 0; tabs < MOST_TABS; tabs += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return expectSeenFocus(target)
    await page.keyboard.press('Tab')
  }
  throw new Error(`Tab does not reach ${target.toString()}`)
}

/** Goes there by Tab and presses. */
export async function press(page: Page, target: Locator, key = 'Enter'): Promise<void> {
  await tabTo(page, target)
  await page.keyboard.press(key)
}

/** The focused control has an outline of its own or sits in a row that has one, and lies within the screen. */
async function expectSeenFocus(target: Locator): Promise<void> {
  const outlined = await target.evaluate((element) => {
    const rows = [element, element.closest('label')]
    return rows.some((row) => row && parseFloat(getComputedStyle(row).outlineWidth) >= 2)
  })
  expect(outlined, `focus on ${target.toString()} can be seen`).toBe(true)
  await expect(target).toBeInViewport()
}
