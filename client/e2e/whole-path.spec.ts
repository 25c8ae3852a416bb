import { createHash } from 'node:crypto'
import { expect, test, type Page } from '@playwright/test'
import { settingsCatalogue } from 'shared'
import { mailedLink } from './support/entry-mail'
import { northPond, northPondNotesFile, withChange } from './support/example'
import { figure, openFromDesk, openTab, row, section } from './support/job-pages'
import { enterByMail, readEveryPage } from './support/landowner'
import { Mailbox } from './support/mailbox'
import { fillPlan, partForm } from './support/plan-form'
import { expectChecks, expectCostShare, expectFigures } from './support/result-pages'
import { putExampleRulesInForce } from './support/rules-in-force'
import { signedIn } from './support/sign-in'
import { signInOf } from './support/sign-ins'

// One job, from hand to hand: each test goes on where the one before it stopped.
test.describe.configure({ mode: 'serial' })

const sign = Date.now().toString(36)
const title = `North pond ${sign}`
const owner = { ...northPond.producer, name: `Odile Marchbank ${sign}`, email: `odile-${sign}@farm.example` }
const mailbox = new Mailbox(owner.email)
const { landownerAsks, supervisorAsks } = northPond
const afterLandowner = withChange(northPond.plan, landownerAsks)
const afterSupervisor = withChange(afterLandowner, supervisorAsks)
const designer = signInOf('planner')
const checkerPerson = signInOf('planner', 1)

let planner: Page
let checker: Page
let supervisor: Page
let office: Page
let administrator: Page
let landowner: Page

test.beforeAll(async ({ browser }) => {
  await putExampleRulesInForce()
  planner = await signedIn(browser, designer)
  checker = await signedIn(browser, checkerPerson)
  supervisor = await signedIn(browser, signInOf('supervisor'))
  office = await signedIn(browser, signInOf('office'))
  administrator = await signedIn(browser, signInOf('administrator'))
  const phone = { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true }
  landowner = await (await browser.newContext(phone)).newPage()
})

test('the settings a design rests on are filled, each with its source', async () => {
  await administrator.getByRole('link', { name: 'Settings' }).click()
  await expect(section(administrator, 'Needed by every design')).toBeVisible()
  await expect(section(administrator, 'Needed and still empty')).toHaveCount(0)
  for (const { key, value } of northPond.settings) {
    const { label = '', unit } = settingsCatalogue.find((setting) => setting.key === key) ?? {}
    const setting = administrator.getByRole('group', { name: label, exact: true })
    await expect(setting.getByLabel(`${label}, ${unit}`, { exact: true })).toHaveValue(String(value))
    await expect(setting.getByLabel(`Source of ${label.toLowerCase()}`)).not.toHaveValue('')
  }
})

test('a list of prices and the payment schedules of the funds are in force', async () => {
  await office.getByRole('link', { name: 'Prices' }).click()
  await expect(office.getByText(/^in force, good from/)).toHaveCount(1)
  await office.getByRole('link', { name: 'Schedules' }).click()
  const schedules = office.getByRole('table', { name: 'Payment schedules' })
  for (const { name, lines } of northPond.schedules) {
    const inForce = row(schedules, name).filter({ hasText: 'in force' })
    await expect(inForce.getByRole('cell', { name: String(lines.length), exact: true })).toBeVisible()
  }
})

test('a planner opens a job for a producer who is new here', async () => {
  await planner.getByRole('link', { name: 'New job' }).click()
  await planner.getByRole('button', { name: 'The producer is new here' }).click()
  const producer = planner.getByRole('form', { name: 'New producer' })
  await producer.getByLabel('Name', { exact: true }).fill(owner.name)
  await producer.getByLabel('Farm or ranch').fill(owner.farmName)
  await producer.getByLabel('E-mail (if known)').fill(owner.email)
  await producer.getByLabel('Add the postal address').check()
  await producer.getByLabel('Street or box').fill(owner.address?.street ?? '')
  await producer.getByLabel('Town').fill(owner.address?.town ?? '')
  await producer.getByLabel('State').fill(owner.address?.region ?? '')
  await producer.getByLabel('Postal code').fill(owner.address?.postalCode ?? '')
  await producer.getByRole('button', { name: 'Add this producer' }).click()
  await expect(planner.getByRole('button', { name: `Take ${owner.name} off` })).toBeVisible()
  const job = planner.getByRole('form', { name: 'New job' })
  await job.getByLabel('Name of the job').fill(title)
  await job.getByLabel('Name of the water').fill(northPond.job.waterName)
  await job.getByLabel('County').fill(northPond.job.county)
  await job.getByLabel('Tract number').fill(northPond.job.tractNumber ?? '')
  await job.getByRole('button', { name: 'Make the job' }).click()
  await expect(planner.getByRole('heading', { level: 1, name: 'Overview' })).toBeVisible()
  await expect(figure(planner.getByRole('main'), 'Producer')).toHaveText(`${owner.name}, ${owner.farmName}`)
})

test('level notes come from a CSV file, reduce as they are read, and are saved', async () => {
  const { startElevationFt, waterSurfaceFt, closing } = northPond.survey
  await openTab(planner, 'Survey')
  await planner.getByLabel('Starting elevation, ft').fill(String(startElevationFt))
  await planner.getByLabel('Water surface, ft (if known)').fill(String(waterSurfaceFt))
  await planner.getByLabel('CSV file of level notes').setInputFiles(northPondNotesFile)
  await expect(planner.getByText('17 rows read from the file.')).toBeVisible()
  await planner.getByLabel('Known elevation, ft (if known)').fill(String(closing?.knownElevationFt))
  await planner.getByLabel('Length in miles, miles (if known)').fill(String(closing?.lengthMiles))
  await planner.getByLabel('Allowed for one mile, ft (if known)').fill(String(closing?.coefficientFt))
  const follows = planner.getByRole('complementary', { name: 'What follows' })
  // Sums and closure as the worked example books them by hand.
  await expect(figure(follows, 'Sum of backsights')).toContainText('15.730')
  await expect(figure(follows, 'Sum of foresights')).toContainText('15.720')
  await expect(figure(follows, 'Misclosure')).toContainText('0.010')
  await expect(figure(follows, 'Allowable')).toContainText('0.024')
  await expect(follows.getByText('closes', { exact: true })).toBeVisible()
  await expect(follows.getByText('12 points')).toBeVisible()
  await planner.getByRole('button', { name: 'Save the survey' }).click()
  await expect(planner.getByText('Saved as version 1.')).toBeVisible()
})

test('a design typed part by part shows figures, checks and shares as worked out apart from it', async () => {
  await openTab(planner, 'Design')
  await planner.getByLabel('Name', { exact: true }).fill('Main design')
  await planner.getByRole('button', { name: 'Make the design' }).click()
  await fillPlan(planner, northPond.plan)
  await planner.getByRole('button', { name: 'Save the design' }).click()
  await expect(planner.getByText(/^Saved as version \d+\.$/)).toBeVisible()
  await expectFigures(planner, northPond.plan)
  await expectChecks(planner, northPond.plan)
  await expectCostShare(planner, northPond.plan)
})

/** The planner has the packet made, a colleague checks it, the planner sends it; gives the mailed link. */
async function makeCheckAndSend(revision: number): Promise<string> {
  await openTab(planner, 'Packet')
  const make = revision === 1 ? 'Make the packet' : `Make the packet as revision ${revision}`
  await planner.getByRole('button', { name: make, exact: true }).click()
  await expect(section(planner, 'Technical check')).toContainText(`revision ${revision}`, { timeout: 30_000 })
  await expect(planner.getByText('You made this design. Another person must check it.')).toBeVisible()

  await openFromDesk(checker, title)
  await checker.getByRole('button', { name: `Record my check of revision ${revision}` }).click()
  await expect(section(checker, 'Technical check')).toContainText(checkerPerson.name)
  await expect(section(checker, 'Technical check').getByText('checked', { exact: true })).toBeVisible()

  await openFromDesk(planner, title)
  await planner.getByRole('button', { name: 'Send to landowner' }).click()
  await expect(section(planner, 'To the landowner')).toContainText('with landowner')
  return mailedLink(mailbox)
}

/** Every open note is answered and settled, then the plan is changed in the fields named by their labels. */
async function answerNotes(answer: string): Promise<void> {
  await openFromDesk(planner, title)
  await planner.getByLabel('Answer', { exact: true }).fill(answer)
  await planner.getByRole('button', { name: 'Answer', exact: true }).click()
  await planner.getByRole('button', { name: /^Settle the note of/ }).click()
  await expect(planner.getByText('Every note is settled.')).toBeVisible()
}

async function changeDesign(changes: readonly [part: string, label: string, value: string][]): Promise<void> {
  await openTab(planner, 'Design')
  await planner.getByRole('link', { name: 'Main design', exact: true }).click()
  const parts = planner.getByRole('navigation', { name: 'Parts of the design' })
  for (const [part, label, value] of changes) {
    await parts.getByRole('link', { name: part }).click()
    await partForm(planner, part).getByLabel(label, { exact: true }).fill(value)
  }
  await planner.getByRole('button', { name: 'Save the design' }).click()
  await expect(planner.getByText(/^Saved as version \d+\.$/)).toBeVisible()
}

/** The landowner, who has come by mail and agreed to electronic records, reads every page and signs. */
async function readAndSign(revision: number): Promise<void> {
  const said = await landowner.getByText(/^\d+ of \d+ read$/).textContent()
  await landowner.getByRole('link', { name: 'Read the packet' }).click()
  await readEveryPage(landowner, Number(said?.split(' ')[2]))
  await landowner.getByRole('link', { name: `Sign revision ${revision}` }).click()
  await landowner.getByLabel('Type your full name').fill(owner.name)
  await landowner.getByLabel('I have read this packet and mean my typed name as my signature').check()
  await landowner.getByRole('button', { name: `Sign revision ${revision}` }).click()
  await expect(landowner.getByRole('heading', { name: 'You have signed' })).toBeVisible()
}

test('a packet goes out once a second planner has checked it, and a landowner on a telephone asks for a change', async () => {
  const link = await makeCheckAndSend(1)
  await enterByMail(landowner, link, mailbox)
  await expect(landowner.getByRole('heading', { level: 1, name: title })).toBeVisible()
  await expect(landowner.getByText('This waits for you.')).toBeVisible()
  await landowner.getByRole('link', { name: 'Ask for a change' }).click()
  await landowner.getByLabel('It is about page').selectOption({ value: String(landownerAsks.page) })
  await landowner.getByLabel('What should change?').fill(landownerAsks.note)
  await landowner.getByRole('button', { name: 'Send it back to the planner' }).click()
  await expect(landowner.getByRole('heading', { name: 'Your change is with the planner' })).toBeVisible()
})

test('the planner answers, changes the design and sends the next revision, which the landowner reads whole and signs', async () => {
  await answerNotes(northPond.plannerAnswersLandowner)
  await changeDesign([
    ['Approach pad', 'Length, ft', '12'],
    ['Berm', 'Station of the crest', '0+20'],
  ])
  await expectFigures(planner, afterLandowner)
  await enterByMail(landowner, await makeCheckAndSend(2), mailbox)
  const agree = landowner.getByLabel('I agree to electronic records for this job')
  await agree.check()
  await landowner.getByRole('button', { name: 'Agree', exact: true }).click()
  await expect(agree).toHaveCount(0)
  await readAndSign(2)
})

test('a supervisor returns it with a note, and the changed revision is signed anew while the old signature is void', async () => {
  await openFromDesk(supervisor, title)
  await supervisor.getByRole('textbox', { name: 'Note 1' }).fill(supervisorAsks.note)
  await supervisor.getByRole('button', { name: 'Return with notes' }).click()
  await expect(section(supervisor, 'Decision')).toContainText('The job is returned')

  await answerNotes(northPond.plannerAnswersSupervisor)
  await changeDesign([['Berm', 'Past the ramp to the left, ft', '50']])
  await expectCostShare(planner, afterSupervisor)
  const link = await makeCheckAndSend(3)
  const revisions = planner.getByRole('table', { name: 'Revisions' })
  await expect(revisions.getByRole('row').filter({ hasText: owner.name })).toContainText('void')
  await enterByMail(landowner, link, mailbox)
  await readAndSign(3)
})

test('once approved, the office sends it by one mail whose PDF has the SHA-256 that the page shows', async () => {
  await openFromDesk(supervisor, title)
  await expect(section(supervisor, 'Signatures')).toContainText(owner.name)
  await supervisor.getByRole('button', { name: 'Approve revision 3' }).click()
  await supervisor.getByRole('dialog').getByRole('button', { name: 'Approve revision 3' }).click()
  await expect(section(supervisor, 'Decision')).toContainText('The job is approved')

  await openFromDesk(office, title)
  const shown = figure(section(office, 'Approved packet'), 'SHA-256')
  await expect(shown).toHaveText(/^[0-9a-f]{64}$/, { timeout: 30_000 })
  await expect(section(office, 'To whom')).toContainText(owner.email)
  await office.getByLabel('I have looked at the addresses, and they are right').check()
  await office.getByRole('button', { name: 'Send the packet' }).click()
  await expect(section(office, 'To whom')).toContainText('The job is sent')
  const packetMails = section(office, 'Mail of this job').getByRole('listitem').filter({ hasText: '.pdf' })
  await expect(packetMails).toHaveCount(1)
  await expect(packetMails).toContainText(/^sent/)

  const mail = await mailbox.next('the packet', ({ attachments }) => attachments.length > 0)
  const [pdf] = mail.attachments
  const hash = createHash('sha256')
    .update(pdf?.content ?? '')
    .digest('hex')
  expect(hash).toBe(await shown.textContent())
})

test('the timeline tells the whole way, in order', async () => {
  await openTab(planner, 'Timeline')
  const main = planner.getByRole('main')
  await expect(main.getByText(`${designer.name} opened the job.`)).toBeVisible()
  const lines = await main.getByRole('listitem').allTextContents()
  const told = lines.reverse().join('\n')
  const way = [
    `${designer.name} opened the job.`,
    `${designer.name} saved the survey.`,
    `${designer.name} froze the design "Main design" as revision 1.`,
    `${checkerPerson.name} checked revision 1.`,
    `${designer.name} sent revision 1 to the landowner.`,
    `${owner.name} came in by the mailed link and code.`,
    `${owner.name} asked for a change of revision 1.`,
    `${designer.name} answered a note.`,
    `${designer.name} sent revision 2 to the landowner.`,
    `${owner.name} signed revision 2.`,
    `${signInOf('supervisor').name} returned revision 2 with 1 note.`,
    'The signatures of revision 2 are void.',
    `${owner.name} signed revision 3.`,
    `${signInOf('supervisor').name} approved revision 3.`,
    `${signInOf('office').name} sent the packet of revision 3.`,
  ]
  const places = way.map((sentence) => told.indexOf(sentence))
  expect(way.filter((_, index) => places[index] === -1)).toEqual([])
  expect(places).toEqual([...places].sort((one, other) => one - other))
})
