import { expect, test, type Page } from '@playwright/test'
import type { DesignView, JobList } from 'shared'
import { ApiPerson } from './support/api-person'
import { mailedCode } from './support/entry-mail'
import { northPond } from './support/example'
import { section } from './support/job-pages'
import {
  approvedJob,
  draftJob,
  jobWithLandowner,
  jobWithSupervisor,
  type JobWithLandowner,
} from './support/job-by-api'
import { partForm } from './support/plan-form'
import { signedIn } from './support/sign-in'
import { otherDistrict, signInOf } from './support/sign-ins'

const planner = signInOf('planner')

/** One part of a fresh example job's design, opened by its planner. */
async function openPart(page: Page, part: string, title: string) {
  const { job, design } = await draftJob()
  await page.goto(`/jobs/${job.id}/design/${design.id}/${part}`)
  return { job, design, form: partForm(page, title) }
}

const follows = (page: Page) => page.getByRole('complementary', { name: 'What follows' })

test.describe('a planner who types what cannot be', () => {
  let page: Page
  test.beforeAll(async ({ browser }) => {
    page = await signedIn(browser, planner)
  })
  test.afterAll(() => page.context().close())

  test('reads at the field what would be right, is led there, and loses nothing typed', async () => {
    const { form } = await openPart(page, 'ramp', 'Ramp')
    const width = form.getByLabel('Width, ft')
    const grade = form.getByLabel('Grade, : 1')
    await width.fill('twelve')
    await grade.fill('0.5')
    await form.getByLabel('Top above full pool, ft').fill('2.25')
    await page.getByRole('button', { name: 'Save the design' }).click()

    const summary = page.getByRole('alert').filter({ hasText: '2 fields need another look' })
    await expect(summary).toBeFocused()
    await expect(width).toHaveAccessibleDescription('Give a number from 4 to 120 ft')
    await expect(grade).toHaveAccessibleDescription(/Must be at least 2 run per rise/)
    await summary.getByRole('link', { name: /^Width/ }).click()
    await expect(width).toBeFocused()
    await expect(width).toHaveValue('twelve')
    await expect(grade).toHaveValue('0.5')
    await expect(form.getByLabel('Top above full pool, ft')).toHaveValue('2.25')

    await width.fill('17')
    await grade.fill('8')
    await page.getByRole('button', { name: 'Save the design' }).click()
    await expect(page.getByText(/^Saved as version 2\.$/)).toBeVisible()
  })

  test('reads in the part itself that the ground line never reaches the top', async () => {
    const { form } = await openPart(page, 'ramp', 'Ramp')
    await form.getByLabel('Top above full pool, ft').fill('19')
    const part = follows(page).getByRole('region', { name: 'Profile of the ramp' })
    await expect(part.getByText('needs another look')).toBeVisible()
    // The highest ground of the bank as it was levelled, and both remedies.
    await expect(part).toContainText('The ground rises only to 103.2 ft at station 0')
    await expect(part).toContainText('enter its station, or lower the top')
  })

  test('reads of a file that is no CSV why it was not read, and keeps the rows that were there', async () => {
    const { job } = await draftJob()
    await page.goto(`/jobs/${job.id}/survey`)
    const rows = page.getByRole('table', { name: 'Level notes, in feet' })
    await expect(rows.getByLabel('Row 2, point')).toHaveValue('0+00')
    const picture = {
      name: 'bank.csv',
      mimeType: 'text/csv',
      buffer: Buffer.from([0x89, 0x50, 0, 1, 2, 255]),
    }
    await page.getByLabel('CSV file of level notes').setInputFiles(picture)
    await expect(page.getByRole('alert')).toContainText('The file could not be read')
    await expect(rows.getByLabel('Row 2, point')).toHaveValue('0+00')
  })

  test('reads of a file whose columns are others which columns were expected', async () => {
    const { job } = await draftJob()
    await page.goto(`/jobs/${job.id}/survey`)
    const other = { name: 'prices.csv', mimeType: 'text/csv', buffer: Buffer.from('item,price\nstone,31\n') }
    await page.getByLabel('CSV file of level notes').setInputFiles(other)
    await expect(page.getByRole('alert')).toContainText(/label.*station/)
  })

  test('sees both versions when a colleague saved in between, and what was typed stays until one is chosen', async () => {
    const { job, design, form } = await openPart(page, 'ramp', 'Ramp')
    const width = form.getByLabel('Width, ft')
    await width.fill('17')
    const colleague = await ApiPerson.signedIn(signInOf('planner', 1))
    const plan = { ...northPond.plan, ramp: { ...northPond.plan.ramp, widthFt: 20 } }
    await colleague.put(`/designs/${design.id}`, { name: design.name, plan }, 1)
    await page.getByRole('button', { name: 'Save the design' }).click()

    const choice = page.getByRole('alert').filter({ hasText: 'Somebody saved in between' })
    await expect(choice).toContainText(signInOf('planner', 1).name)
    const differs = choice.getByRole('row', { name: /Ramp, width/ })
    await expect(differs.getByRole('cell')).toHaveText(['17', '20'])
    await expect(width).toHaveValue('17')
    await choice.getByRole('button', { name: 'Save mine over it' }).click()
    await expect(page.getByText('Saved as version 3.')).toBeVisible()
    const [stored] = await colleague.get<DesignView[]>(`/jobs/${job.id}/designs`)
    expect(stored?.plan.ramp?.widthFt).toBe(17)
  })

  test('whose session ends signs in again over the page and saves what is still there', async () => {
    const { form } = await openPart(page, 'ramp', 'Ramp')
    const width = form.getByLabel('Width, ft')
    const workedOut = page.waitForResponse(/\/calculate$/)
    await width.fill('19')
    await workedOut
    await page.context().clearCookies()
    await page.getByRole('button', { name: 'Save the design' }).click()
    const dialog = page.getByRole('dialog', { name: 'Sign in once more' })
    await expect(dialog).toBeVisible()
    await dialog.getByLabel('Password').fill(planner.password)
    await dialog.getByRole('button', { name: 'Sign in' }).click()
    await expect(dialog).toBeHidden()
    await expect(width).toHaveValue('19')
    await page.getByRole('button', { name: 'Save the design' }).click()
    await expect(page.getByText('Saved as version 2.')).toBeVisible()
  })
})

test.describe('who may not', () => {
  test('a planner is offered no decision on a job that waits for the supervisor', async ({ browser }) => {
    const { job } = await jobWithSupervisor()
    const page = await signedIn(browser, planner)
    await page.goto(`/jobs/${job.id}/review`)
    await expect(section(page, 'Decision')).toContainText('Nothing waits for your decision.')
    await expect(page.getByRole('button', { name: /^(Approve|Return)/ })).toHaveCount(0)
    await page.context().close()
  })

  test('a supervisor reads the settings of the district and cannot change them', async ({ browser }) => {
    const page = await signedIn(browser, signInOf('supervisor'))
    await page.getByRole('link', { name: 'Settings' }).click()
    const needed = page.getByRole('table', { name: 'Needed by every design' })
    await expect(needed.getByRole('row').nth(1)).toBeVisible()
    await expect(page.getByRole('textbox')).toHaveCount(0)
    await expect(page.getByRole('button', { name: /save/i })).toHaveCount(0)
    await page.context().close()
  })

  test('a job of another district is, by its address too, nothing at all', async ({ browser }) => {
    const stranger = await ApiPerson.signedIn(signInOf('planner', 0, otherDistrict()))
    const { jobs } = await stranger.get<JobList>('/jobs')
    const [theirs] = jobs
    const page = await signedIn(browser, planner)
    await page.goto(`/jobs/${theirs?.id}`)
    await expect(page.getByRole('alert')).toContainText('There is nothing here for you')
    await expect(page.getByText(theirs?.title ?? '')).toHaveCount(0)
    await page.context().close()
  })
})

test('the packet goes out once, however often the button is pressed', async ({ browser }) => {
  const { job, mailbox } = await approvedJob()
  const page = await signedIn(browser, signInOf('office'))
  await page.goto(`/jobs/${job.id}/send`)
  await page.getByLabel('I have looked at the addresses, and they are right').check()
  await page.getByRole('button', { name: 'Send the packet' }).dblclick()
  await expect(section(page, 'To whom')).toContainText('The job is sent')
  const withPdf = section(page, 'Mail of this job').getByRole('listitem').filter({ hasText: '.pdf' })
  await expect(withPdf).toContainText(/^sent/)
  await expect(withPdf).toHaveCount(1)
  await mailbox.next('the packet', ({ attachments }) => attachments.length > 0)
  expect(await mailbox.rest()).toEqual([])
  await page.context().close()
})

test.describe('a mailed link', () => {
  let here: JobWithLandowner
  test.beforeAll(async () => {
    here = await jobWithLandowner()
  })

  async function askForCode(page: Page): Promise<string> {
    await page.goto(here.link)
    await page.getByRole('button', { name: 'Send me the code' }).click()
    return mailedCode(here.mailbox)
  }

  test('opens nothing with a wrong code, and still takes the right one', async ({ page }) => {
    const code = await askForCode(page)
    const field = page.getByLabel('Code from the mail')
    await field.fill(code === '000000' ? '000001' : '000000')
    await page.getByRole('button', { name: 'Open my packet' }).click()
    await expect(page.getByRole('alert')).toContainText('The code is not right or no longer good')
    await field.fill(code)
    await page.getByRole('button', { name: 'Open my packet' }).click()
    await expect(page).toHaveURL(/\/my\//)
  })

  test('with a code that was used once opens nothing a second time', async ({ page }) => {
    const code = await askForCode(page)
    await new ApiPerson().post('/entry/code', { token: here.link.split('#t=')[1], code })
    await page.getByLabel('Code from the mail').fill(code)
    await page.getByRole('button', { name: 'Open my packet' }).click()
    await expect(page.getByRole('alert')).toContainText('The code is not right or no longer good')
  })

  test('that was replaced by a newer one says that it is no longer good', async ({ page }) => {
    const sender = await ApiPerson.signedIn(planner)
    await sender.act(`/jobs/${here.job.id}/links`)
    await page.goto(here.link)
    await page.getByRole('button', { name: 'Send me the code' }).click()
    await expect(page.getByRole('alert')).toContainText('This link is no longer good')
    await expect(page.getByLabel('Code from the mail')).toHaveCount(0)
  })

  test('that is cut short says so and asks for no code', async ({ page }) => {
    await page.goto('/enter#t=abc')
    await expect(page.getByText('This address is missing the secret part of the link.')).toBeVisible()
    await expect(page.getByRole('button', { name: 'Send me the code' })).toHaveCount(0)
  })
})
