export interface SearchableJob {
  number: string
  title: string
  waterName: string
  producers: readonly { name: string; farmName: string }[]
}

/** What the table of jobs is searched in: small letters, one space between words. */
export function searchText({ number, title, waterName, producers }: SearchableJob): string {
  const names = producers.flatMap(({ name, farmName }) => [name, farmName])
  return searchWords([number, title, waterName, ...names].join(' '))
}

/** The same for what is typed into the search box. */
export const searchWords = (text: string): string => text.toLowerCase().replace(/\s+/g, ' ').trim()

/** As a pattern for LIKE that finds the very characters, `%` and `_` among them. */
export const likePattern = (words: string): string => `%${words.replace(/[\\%_]/g, '\\$&')}%`
