import { expect, type Browser, type BrowserContext, type Page } from '@playwright/test'
import type { SignIn } from './sign-ins'

/** Through the sign-in page, as a person does it; lands on the desk. */
export async function signIn(page: Page, { email, password }: SignIn): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('heading', { name: 'Waiting for you' })).toBeVisible()
}

type Kept = Awaited<ReturnType<BrowserContext['storageState']>>
const kept = new Map<string, Kept>()

/** A browser of this person's own, signed in; a second one goes on with the session of the first. */
export async function signedIn(browser: Browser, person: SignIn): Promise<Page> {
  const storageState = kept.get(person.email)
  const context = await browser.newContext({ storageState })
  const page = await context.newPage()
  if (storageState === undefined) {
    await signIn(page, person)
    kept.set(person.email, await context.storageState())
  } else {
    await page.goto('/desk')
  }
  return page
}
