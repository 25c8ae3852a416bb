import { expect, type Locator, type Page } from '@playwright/test'

/** The pages of a job as its tabs name them. */
export async function openTab(page: Page, tab: string, heading = tab): Promise<void> {
  const tabs = page.getByRole('navigation', { name: 'Pages of this job' })
  await tabs.getByRole('link', { name: new RegExp(`^${tab}`) }).click()
  await expect(page.getByRole('heading', { level: 1, name: heading })).toBeVisible()
}

/** A part of a page under its heading. */
export const section = (page: Page, title: string): Locator =>
  page.getByRole('region', { name: title, exact: true })

/** The value that stands beside a label in a column of figures. */
export const figure = (scope: Locator, label: string): Locator =>
  scope
    .locator('dl > div')
    .filter({ has: scope.page().locator('dt').getByText(label, { exact: true }) })
    .locator('dd')

/** The row of a table that begins with these words. */
export const row = (table: Locator, words: string): Locator =>
  table.getByRole('row').filter({ has: table.page().getByRole('rowheader', { name: words, exact: true }) })

/** From the desk to the page on which this job waits for the person. */
export async function openFromDesk(page: Page, jobTitle: string): Promise<void> {
  await page.getByRole('navigation', { name: 'Wadestone' }).getByRole('link', { name: 'Desk' }).click()
  await page.reload()
  await page.getByRole('listitem').filter({ hasText: jobTitle }).getByRole('link').click()
}
