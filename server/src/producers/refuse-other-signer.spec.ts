import { refuseOtherSigner } from './refuse-other-signer'

const job = { jobId: 'j', number: 'T-1', state: 'draft', isPersonTwice: false }

describe('another address for a producer', () => {
  it.each(['with-supervisor', 'approved'])('is refused while a job is %s, and says which', (state) => {
    expect(() => refuseOtherSigner([job, { ...job, number: 'T-2', state }])).toThrow(/T-2 is signed/)
  })

  it('is refused when another signer of the job has it', () => {
    expect(() => refuseOtherSigner([{ ...job, isPersonTwice: true }])).toThrow(/own address/)
  })

  it.each(['draft', 'returned', 'with-landowner'])('is taken while a job is %s', (state) => {
    expect(() => refuseOtherSigner([{ ...job, state }])).not.toThrow()
  })
})
