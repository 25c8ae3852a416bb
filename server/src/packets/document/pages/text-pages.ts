import type { JobInput } from 'shared'
import type { Block, PageDraft } from '../layout/block.js'
import { cautions, permitQuestions } from '../texts/cautions.js'
import { constructionNotes } from '../texts/construction-notes.js'
import { operationAndMaintenance, practiceLives } from '../texts/operation-and-maintenance.js'
import { itemsFor, sourceLines, type TextBlock } from '../texts/text-block.js'

type Body = JobInput['body']

function blocksOf(block: TextBlock, body: Body, marker: 'number' | 'box'): Block[] {
  const items = itemsFor(block, body)
  return [
    { kind: 'paragraph', text: block.lead },
    { kind: 'list', marker, items: items.map(({ text }) => text) },
  ]
}

function sourcesOf(block: TextBlock, body: Body): Block[] {
  return [
    { kind: 'heading', text: 'Sources, by number of the line' },
    {
      kind: 'paragraph',
      size: 'small',
      tone: 'mute',
      text: `${sourceLines(itemsFor(block, body)).join(' ')} Words: version ${block.version}.`,
    },
  ]
}

export const constructionPage = (body: Body): PageDraft => ({
  title: constructionNotes.title,
  blocks: [...blocksOf(constructionNotes, body, 'number'), ...sourcesOf(constructionNotes, body)],
})

export const maintenancePage = (body: Body): PageDraft => ({
  title: operationAndMaintenance.title,
  blocks: [
    ...blocksOf(operationAndMaintenance, body, 'number'),
    { kind: 'heading', text: 'Practice lives that publications give' },
    {
      kind: 'table',
      columns: [
        { title: 'Practice', share: 44 },
        { title: 'Years', share: 16 },
        { title: 'Source', share: 40 },
      ],
      rows: practiceLives.map(({ practice, name, years, source }) => ({
        cells: [`${practice}, ${name}`, years, source],
      })),
    },
    {
      kind: 'paragraph',
      size: 'small',
      text: 'The agreement with each fund governs how long the work must be kept.',
    },
    ...sourcesOf(operationAndMaintenance, body),
  ],
})

export const cautionsPage = (body: Body): PageDraft => ({
  title: permitQuestions.title,
  blocks: [
    { kind: 'heading', text: 'Keep in mind' },
    { kind: 'list', items: [...cautions] },
    { kind: 'heading', text: 'Ask first' },
    ...blocksOf(permitQuestions, body, 'box'),
    ...sourcesOf(permitQuestions, body),
  ],
})
