import { expect, type Page } from '@playwright/test'
import { mailedCode } from './entry-mail'
import type { Mailbox } from './mailbox'

/** Opens the mailed link, has a code mailed and types it. */
export async function enterByMail(page: Page, link: string, mailbox: Mailbox): Promise<void> {
  // The secret stands behind the #, so without a blank page between, a second link would not load anew.
  await page.goto('about:blank')
  await page.goto(link)
  await page.getByRole('button', { name: 'Send me the code' }).click()
  await page.getByLabel('Code from the mail').fill(await mailedCode(mailbox))
  await page.getByRole('button', { name: 'Open my packet' }).click()
  await expect(page).toHaveURL(/\/my\//)
}

/** Turns every page from the first to the last; each says that it counts as read. */
export async function readEveryPage(page: Page, count: number): Promise<void> {
  for (let number = 1; number <= count; number += 1) {
    const title = new RegExp(`^Page ${number} of ${count}: `)
    await expect(page.getByRole('heading', { level: 1, name: title })).toBeVisible()
    await expect(page.getByText('Read', { exact: true })).toBeVisible()
    if (number < count) await page.getByRole('link', { name: 'Next page' }).click()
  }
}
