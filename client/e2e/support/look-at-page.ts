import { AxeBuilder } from '@axe-core/playwright'
import { expect, type Page } from '@playwright/test'

const wcag22aa = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']

/** Opens a page and waits until everything on it has come. */
export async function openWhole(page: Page, path: string): Promise<void> {
  await page.goto(path, { waitUntil: 'domcontentloaded' })
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
  await expect(page.getByText('Loading', { exact: true })).toHaveCount(0)
}

/** What breaks WCAG 2.2 AA on the page as it stands, one line a place. */
export async function accessFaults(page: Page, path: string): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page })
    .options({ resultTypes: ['violations'] })
    .withTags(wcag22aa)
    .setLegacyMode(true)
    .analyze()
  return violations.flatMap(({ id, help, nodes }) =>
    nodes.map(({ target }) => `${path}: ${id}, ${help}: ${target.join(' ')}`),
  )
}

/** The widths at which the page itself scrolls sideways; tables may, inside themselves. */
export async function widthsThatScroll(
  page: Page,
  path: string,
  widths: readonly number[],
): Promise<string[]> {
  const faults: string[] = []
  for (const width of widths) {
    await page.setViewportSize({ width, height: 900 })
    const wide = await page.evaluate(() => document.documentElement.scrollWidth)
    if (wide > width) faults.push(`${path}: ${wide} px wide on a screen of ${width} px`)
  }
  return faults
}
