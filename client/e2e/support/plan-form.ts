import type { Locator, Page } from '@playwright/test'
import { formatStation, quantityCatalogue, unitText, type DesignPlan, type QuantityKey } from 'shared'
import { pointsSpec } from '../../src/features/designs/fence-path-specs'
import { partCatalogue } from '../../src/features/designs/part-catalogue'
import type { FieldSpec, GroupSpec, ListSpec, OwnSpec, PartItem } from '../../src/features/designs/part-spec'

type Values = Readonly<Record<string, unknown>>

/** The label of a field as a screen reader tells it: with unit, and whether it may stay empty. */
const spoken = (label: string, unit?: string, isOptional?: boolean): string =>
  `${label}${unit ? `, ${unit}` : ''}${isOptional ? ' (if known)' : ''}`

const labelled = (scope: Locator, words: string): Locator => scope.getByLabel(words, { exact: true })

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1)

async function fillField(scope: Locator, spec: FieldSpec, value: unknown): Promise<void> {
  const field = labelled(scope, spoken(spec.label, spec.unit, spec.isOptional))
  if (spec.control === 'check') return field.setChecked(value === true)
  if (spec.control === 'select') {
    await field.selectOption({ value: String(value) })
    return
  }
  const isStation = spec.control === 'station'
  await field.fill(isStation ? formatStation({ stationFt: Number(value), decimals: 0 }) : String(value))
}

async function fillList(scope: Locator, spec: ListSpec, rows: readonly Values[]): Promise<void> {
  const list = scope.getByRole('region', { name: spec.title, exact: true })
  const row = (index: number) =>
    list.getByRole('group', { name: `${capital(spec.one)} ${index + 1}`, exact: true })
  for (const [index, values] of rows.entries()) {
    if ((await row(index).count()) === 0) {
      // Rows inside rows have buttons of their own; the one of this list stands last in it.
      await list
        .getByRole('button', { name: `Add a ${spec.one}`, exact: true })
        .last()
        .click()
    }
    await fillItems(row(index), spec.items, values)
  }
}

async function fillGroup(scope: Locator, spec: GroupSpec, values: Values): Promise<void> {
  await scope.getByRole('button', { name: `Add: ${spec.title.toLowerCase()}` }).click()
  await fillItems(scope.getByRole('region', { name: spec.title, exact: true }), spec.items, values)
}

const fillOwn: Record<OwnSpec['kind'], (scope: Locator, value: unknown) => Promise<void>> = {
  'fence-path': (scope, value) => fillList(scope, pointsSpec, (value as { points: Values[] }).points),
  'roll-lengths': async (scope, value) => {
    const rolls = scope.getByRole('region', { name: 'Length of a roll' })
    for (const [kind, feet] of Object.entries(value as Values)) {
      await labelled(rolls, spoken(kind, 'ft')).fill(String(feet))
    }
  },
  schedule: async (scope, value) => {
    await labelled(scope, 'Fund').selectOption({ value: String(value) })
  },
  contracted: async (scope, value) => {
    for (const [key, quantity] of Object.entries(value as Values)) {
      const { description, unit } = quantityCatalogue[key as QuantityKey]
      await labelled(scope, spoken(description, unitText(unit), true)).fill(String(quantity))
    }
  },
}

async function fillItems(scope: Locator, items: readonly PartItem[], values: Values): Promise<void> {
  for (const item of items) {
    const value = values[item.name]
    if (value === undefined) continue
    if (item.kind === 'field') await fillField(scope, item, value)
    else if (item.kind === 'list') await fillList(scope, item, value as Values[])
    else if (item.kind === 'group') await fillGroup(scope, item, value as Values)
    else await fillOwn[item.kind](scope, value)
  }
}

/** The form of the part on the page. A group in it may bear the same name, so the outer one is meant. */
export const partForm = (page: Page, title: string): Locator =>
  page.getByRole('form').getByRole('region', { name: title, exact: true }).first()

/** Fills every part of a plan through its form, going from part to part as the page offers it. */
export async function fillPlan(page: Page, plan: DesignPlan): Promise<void> {
  for (const [index, spec] of partCatalogue.entries()) {
    const form = partForm(page, spec.title)
    await form.getByRole('button', { name: 'Start this part' }).click()
    await fillItems(form, spec.items, plan[spec.part] as Values)
    const next = partCatalogue[index + 1]
    if (next) await page.getByRole('link', { name: `Next: ${next.title}` }).click()
  }
}
