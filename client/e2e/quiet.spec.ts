import { expect, test, type Page } from '@playwright/test'
import { address } from './support/address'
import { enterByMail } from './support/landowner'
import { jobWithLandowner } from './support/job-by-api'
import { openWhole } from './support/look-at-page'
import { landownerPages, pagesOf } from './support/page-list'
import { signedIn } from './support/sign-in'
import { signInOf } from './support/sign-ins'

interface Heard {
  /** Addresses asked for that are not the product's own. */
  foreign: string[]
  /** Errors of the console, of scripts, and refusals by the content policy. */
  errors: string[]
}

/** Listens to a page from now on. */
async function listen(page: Page): Promise<Heard> {
  const heard: Heard = { foreign: [], errors: [] }
  page.on('request', (request) => {
    const isOwn = new URL(request.url()).origin === address || /^(data|blob):/.test(request.url())
    if (!isOwn) heard.foreign.push(request.url())
  })
  page.on('console', (message) => {
    if (message.type() === 'error') heard.errors.push(`${page.url()}: ${message.text()}`)
  })
  page.on('pageerror', (error) => heard.errors.push(`${page.url()}: ${error.message}`))
  await page.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', ({ violatedDirective, blockedURI }) =>
      console.error(`refused by the content policy: ${violatedDirective} ${blockedURI}`),
    )
  })
  return heard
}

test('a planner’s walk over every page asks nothing of another machine and leaves no error behind', async ({
  browser,
}) => {
  const page = await signedIn(browser, signInOf('planner'))
  const heard = await listen(page)
  for (const path of await pagesOf('planner')) await openWhole(page, path)
  expect(heard).toEqual({ foreign: [], errors: [] })
  await page.context().close()
})

test('a landowner’s way in and through the packet asks nothing of another machine and leaves no error behind', async ({
  page,
}) => {
  const heard = await listen(page)
  const { job, link, mailbox } = await jobWithLandowner()
  await enterByMail(page, link, mailbox)
  for (const path of landownerPages(job.id)) await openWhole(page, path)
  await openWhole(page, `/my/${job.id}/read/1`)
  await page.getByRole('button', { name: 'Español' }).click()
  await expect(page.locator('html')).toHaveAttribute('lang', 'es')
  expect(heard).toEqual({ foreign: [], errors: [] })
})

test('an address deep in the product shows the same page when it is loaded anew', async ({ browser }) => {
  const page = await signedIn(browser, signInOf('planner'))
  await openWhole(page, '/jobs?state=draft&find=Abernethy')
  await page.getByRole('table').getByRole('link').first().click()
  await page.getByRole('link', { name: 'Checks', exact: true }).first().click()
  await page.getByRole('button', { name: /^\d+ holds?$/ }).click()
  const { href } = new URL(page.url())
  await page.reload()
  await expect(page.getByRole('heading', { level: 1, name: 'Checks' })).toBeVisible()
  await expect(page.getByRole('button', { name: /^\d+ holds?$/ })).toHaveAttribute('aria-pressed', 'true')
  expect(page.url()).toBe(href)
  await page.context().close()
})

test('one who is not signed in is led back to the page asked for, once signed in', async ({ page }) => {
  const { email, password } = signInOf('office')
  await page.goto('/jobs?find=Pell')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Jobs' })).toBeVisible()
  await expect(page.getByLabel('Find a job, a person, a tract')).toHaveValue('Pell')
})

test('a file that is not there is answered 404, not with a page', async ({ request }) => {
  for (const path of ['/assets/none.js', '/none.png', '/api/none']) {
    const answer = await request.get(path)
    expect(answer.status(), path).toBe(404)
    expect(answer.headers()['content-type'] ?? '', path).not.toContain('text/html')
  }
})
