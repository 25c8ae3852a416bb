import { test } from '@playwright/test'
import { approvedJob } from './support/job-by-api'
import { expectedDesign, northPond } from './support/example'
import { signedIn } from './support/sign-in'
import { signInOf } from './support/sign-ins'
test('x', async ({ browser }) => {
  const r = expectedDesign(northPond.plan)
  console.log(r.cost.ok && r.cost.value.typical, r.funding.ok && r.funding.value.landownerShare, r.rock.ok && r.rock.value.totalOrderTons)
  let t = Date.now()
  const p = await signedIn(browser, signInOf('planner'))
  console.log('signin', Date.now() - t)
  t = Date.now()
  const st = await p.context().storageState()
  const c2 = await browser.newContext({ storageState: st })
  const p2 = await c2.newPage(); await p2.goto('/desk'); await p2.getByRole('heading', { name: 'Waiting for you' }).waitFor({timeout: 5000})
  console.log('state', Date.now() - t)
  t = Date.now()
  const j = await approvedJob()
  console.log('approved', Date.now() - t, j.job.id)
})
