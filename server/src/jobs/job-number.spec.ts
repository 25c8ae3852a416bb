import { jobNumber } from './job-number'
import { likePattern, searchText, searchWords } from './search-text'

describe('the number of a job', () => {
  it("holds the district's letters, the year of the district's own date and the count", () => {
    expect(jobNumber({ prefix: 'TF', onDate: '2026-12-31', sequence: 41 })).toBe('TF-2026-041')
  })

  it('grows past three digits and does without letters', () => {
    expect(jobNumber({ prefix: '', onDate: '2026-01-01', sequence: 1204 })).toBe('2026-1204')
  })
})

describe('the words a job is found by', () => {
  it('are its number, title, water, producers and farms in small letters', () => {
    const producers = [{ name: 'Odile  Marchbank', farmName: 'Home Farm' }]
    const text = searchText({ number: 'TF-2026-041', title: 'North Pond', waterName: 'Pond', producers })
    expect(text).toBe('tf-2026-041 north pond pond odile marchbank home farm')
    expect(text).toContain(searchWords('  ODILE   marchbank '))
  })

  it('take % and _ as characters, not as wild cards', () => {
    expect(likePattern('50%_\\')).toBe('%50\\%\\_\\\\%')
  })
})
