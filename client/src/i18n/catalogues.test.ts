import { describe, expect, it } from 'vitest'
import { en } from './en'
import { es } from './es'

interface Entry {
  key: string
  words: string
}

const entriesOf = (catalogue: object, under = ''): Entry[] =>
  Object.entries(catalogue).flatMap(([key, value]: [string, unknown]) =>
    typeof value === 'object' && value !== null
      ? entriesOf(value, `${under}${key}.`)
      : [{ key: `${under}${key}`, words: String(value) }],
  )

const english = entriesOf(en)
const spanish = new Map(entriesOf(es).map(({ key, words }) => [key, words]))
const gapsIn = (words = ''): string => (words.match(/\{\{\w+\}\}/g) ?? []).sort().join(' ')

describe('what a landowner reads', () => {
  it('has the same keys in English and in Spanish', () => {
    expect([...spanish.keys()].sort()).toEqual(english.map(({ key }) => key).sort())
  })

  it('has the same gaps to fill in both languages', () => {
    const unlike = english.filter(({ key, words }) => gapsIn(spanish.get(key)) !== gapsIn(words))
    expect(unlike).toEqual([])
  })

  it('leaves no sentence empty in either language', () => {
    expect([...english.map(({ words }) => words), ...spanish.values()].filter((words) => !words)).toEqual([])
  })
})
