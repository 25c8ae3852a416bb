import { letterText } from './letter.js'
import { letters, secretKinds, type LetterFacts, type MailKind } from './letters.js'

const origin = 'https://ramps.example'
const job = { jobId: '1b7c0c4e-6f0e-4c57-9d8e-0c8d3c0f7a11', number: 'AB-7', title: 'North pond ramp' }
const facts: LetterFacts = {
  'entry-link': { ...job, recipientName: 'Ada Fen', token: 'T'.repeat(43), daysValid: 14 },
  'entry-code': { code: '012345', minutesValid: 10 },
  returned: { ...job, returnedBy: 'supervisor', words: ['Move the gate.'] },
  signed: { ...job, revision: 2 },
  approved: { ...job, revision: 2 },
  packet: { ...job, recipientName: 'Ada Fen', fileName: 'AB-7-packet.pdf', sha256: 'a'.repeat(64) },
}

const written = <Kind extends MailKind>(kind: Kind) => letters[kind](facts[kind], origin)

describe('every letter', () => {
  for (const kind of Object.keys(letters) as MailKind[]) {
    it(`of the kind ${kind} has a subject of one line and says which district writes`, () => {
      const letter = written(kind)
      expect(letter.subject).not.toMatch(/\p{Cc}/u)
      expect(letterText(letter, 'Fen County district')).toContain('\n\nFen County district\n\n')
    })

    it(`of the kind ${kind} tells no address but our own`, () => {
      const addresses = letterText(written(kind), 'Fen').match(/https?:\/\/\S+/g) ?? []
      for (const address of addresses) expect(address.startsWith(`${origin}/`)).toBe(true)
    })
  }

  it('that lets somebody in is one of the kinds whose text is wiped', () => {
    const letsIn = (Object.keys(letters) as MailKind[]).filter((kind) =>
      /T{43}|012345/.test(written(kind).paragraphs.join('\n')),
    )
    expect(letsIn.sort()).toEqual([...secretKinds].sort())
  })

  it('keeps the secret of a link behind a number sign, where no server gets it', () => {
    expect(written('entry-link').paragraphs.join('\n')).toContain(`${origin}/enter#t=${'T'.repeat(43)}`)
  })
})
