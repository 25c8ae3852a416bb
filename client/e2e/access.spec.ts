import { expect, test, type Locator, type Page } from '@playwright/test'
import type { Role } from 'shared'
import { enterByMail } from './support/landowner'
import { accessFaults, openWhole, widthsThatScroll } from './support/look-at-page'
import { jobWithLandowner } from './support/job-by-api'
import { landownerPages, pagesOf } from './support/page-list'
import { signedIn } from './support/sign-in'
import { signInOf } from './support/sign-ins'

const staffRoles: Exclude<Role, 'landowner'>[] = ['administrator', 'office', 'supervisor', 'planner']
const desktop = 1440
const phone = 390

async function faultsOf(page: Page, paths: readonly string[], atWidth: number): Promise<string[]> {
  const faults: string[] = []
  for (const path of paths) {
    await page.setViewportSize({ width: atWidth, height: 900 })
    await openWhole(page, path)
    faults.push(...(await accessFaults(page, path)))
    faults.push(...(await widthsThatScroll(page, path, [desktop, 834, phone])))
  }
  return faults
}

for (const role of staffRoles) {
  test(`every page of a person with the role ${role} keeps WCAG 2.2 AA and scrolls sideways at no width`, async ({
    browser,
  }) => {
    const page = await signedIn(browser, signInOf(role))
    expect(await faultsOf(page, await pagesOf(role), desktop)).toEqual([])
    await page.context().close()
  })
}

test('every page of a landowner keeps WCAG 2.2 AA on a telephone and scrolls sideways at no width', async ({
  page,
}) => {
  const { job, link, mailbox } = await jobWithLandowner()
  expect(await faultsOf(page, ['/sign-in', '/enter', link], phone)).toEqual([])
  await enterByMail(page, link, mailbox)
  expect(await faultsOf(page, landownerPages(job.id), phone)).toEqual([])
})

/** Presses Tab until the focus is there. */
async function tabTo(page: Page, target: Locator): Promise<void> {
  for (let presses = 0; presses < 60; presses += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return
    await page.keyboard.press('Tab')
  }
  await expect(target).toBeFocused()
}

/** Whether it can be seen where the focus is: the place looks other without it. */
async function isFocusSeen(page: Page, target: Locator): Promise<boolean> {
  await expect(target).toBeFocused()
  const box = await target.boundingBox()
  if (box === null) return false
  const around = { x: box.x - 16, y: box.y - 8, width: box.width + 32, height: box.height + 16 }
  const withFocus = await page.screenshot({ clip: around, animations: 'disabled' })
  await target.evaluate((element: HTMLElement) => element.blur())
  const without = await page.screenshot({ clip: around, animations: 'disabled' })
  await target.focus()
  return !withFocus.equals(without)
}

test('the keyboard alone signs in and opens a job, with the focus in sight and on the heading of each new page', async ({
  page,
}) => {
  const { email, password } = signInOf('planner')
  await openWhole(page, '/sign-in')
  const emailField = page.getByLabel('E-mail')
  await tabTo(page, emailField)
  expect(await isFocusSeen(page, emailField)).toBe(true)
  await page.keyboard.type(email)
  await page.keyboard.press('Tab')
  await page.keyboard.type(password)
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { level: 1, name: 'Waiting for you' })).toBeFocused()

  const jobs = page.getByRole('link', { name: 'Jobs', exact: true })
  // From the heading the navigation lies backwards; a page loaded anew begins at its top.
  await openWhole(page, '/desk')
  await tabTo(page, jobs)
  expect(await isFocusSeen(page, jobs)).toBe(true)
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { level: 1, name: 'Jobs' })).toBeFocused()

  const job = page.getByRole('table').getByRole('link').first()
  await tabTo(page, job)
  expect(await isFocusSeen(page, job)).toBe(true)
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { level: 1, name: 'Overview' })).toBeFocused()
})

test('the first Tab offers to skip to the page, and going there leaves the navigation behind', async ({
  browser,
}) => {
  const page = await signedIn(browser, signInOf('supervisor'))
  await openWhole(page, '/people')
  await page.keyboard.press('Tab')
  const skip = page.getByRole('link', { name: 'Skip to the page' })
  await expect(skip).toBeFocused()
  await expect(skip).toBeInViewport()
  await page.keyboard.press('Enter')
  await expect(page.getByRole('main')).toBeFocused()
  await page.context().close()
})
