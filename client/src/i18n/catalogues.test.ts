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
const gapsIn = (words = ''): string[] => [...words.matchAll(/\{\{(\w+)\}\}/g)].map(([gap]) => gap).sort()

describe('what a landowner reads', () => {
  it('has the same keys in English and in Spanish', () => {
    expect([...spanish.keys()].sort()).toEqual(english.map(({ key }) => key).sort())
  })

  it.each(english)('has the same gaps to fill in both languages: $key', ({ key, words }) => {
    expect(gapsIn(spanish.get(key))).toEqual(gapsIn(words))
  })

  it('leaves no sentence empty in either language', () => {
    expect([...english.map(({ words }) => words), ...spanish.values()].filter((words) => !words)).toEqual([])
  })
})
