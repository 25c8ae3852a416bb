import { expect, type Browser, type BrowserContextOptions, type Page } from '@playwright/test'
import type { SignIn } from './sign-ins'

/** Through the sign-in page, as a person does it; lands on the desk. */
export async function signIn(page: Page, { email, password }: SignIn): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('heading', { name: 'Waiting for you' })).toBeVisible()
}

/** A browser of this person's own, signed in. */
export async function signedIn(
  browser: Browser,
  person: SignIn,
  options: BrowserContextOptions = {},
): Promise<Page> {
  const context = await browser.newContext(options)
  const page = await context.newPage()
  await signIn(page, person)
  return page
}
