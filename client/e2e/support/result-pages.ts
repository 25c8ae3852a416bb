import { expect, type Page } from '@playwright/test'
import { formatQuantity, moneyText, type DesignPlan } from 'shared'
import { countText, verdictOrder } from '../../src/features/checks/check-counts'
import { expectedDesign } from './example'
import { figure, openTab, row, section } from './job-pages'

function readyDesign(plan: DesignPlan) {
  const { quantities, cost, funding, checks } = expectedDesign(plan)
  if (!quantities.ok || !cost.ok || !funding.ok) throw new Error('The example is not worked out whole.')
  return { quantities: quantities.value, cost: cost.value, funding: funding.value, checks }
}

/** Every line of the bill of quantities. */
export async function expectFigures(page: Page, plan: DesignPlan): Promise<void> {
  const { quantities } = readyDesign(plan)
  await openTab(page, 'Figures')
  const bill = page.getByRole('table', { name: 'Bill of quantities' })
  await expect(bill.getByRole('rowheader')).toHaveCount(quantities.length)
  for (const { description, quantity, unit } of quantities) {
    await expect(row(bill, description).getByRole('cell').first()).toHaveText(formatQuantity(quantity, unit))
  }
}

/** As many of each verdict as worked out, and none that fails. */
export async function expectChecks(page: Page, plan: DesignPlan): Promise<void> {
  const { checks } = readyDesign(plan)
  await openTab(page, 'Checks')
  const counts = page.getByRole('group', { name: 'Which checks to show' })
  for (const verdict of verdictOrder) {
    const count = checks.filter((check) => check.verdict === verdict).length
    await expect(counts.getByRole('button', { name: countText(verdict, count), exact: true })).toBeVisible()
  }
  await expect(counts.getByRole('button', { name: '0 fail', exact: true })).toBeVisible()
}

/** Every line of the cost, what each fund pays, and what is left to the landowner. */
export async function expectCostShare(page: Page, plan: DesignPlan): Promise<void> {
  const { cost, funding } = readyDesign(plan)
  await openTab(page, 'Cost and funding')
  const table = page.getByRole('table', { name: 'Estimated cost' })
  for (const { description, typical } of cost.lines) {
    await expect(row(table, description).getByRole('cell').nth(3)).toHaveText(moneyText(typical))
  }
  const whoPays = section(page, 'Who pays')
  await expect(figure(whoPays, 'Estimated cost')).toHaveText(moneyText(cost.typical))
  for (const { name, paid } of funding.sources) {
    await expect(figure(whoPays, `Paid by ${name}`)).toHaveText(moneyText(`-${paid}`))
  }
  await expect(figure(whoPays, 'Landowner’s share')).toHaveText(moneyText(funding.landownerShare))
}
