import { Problem } from 'shared'
import type { OpenJob } from './signing-jobs.js'

/** From the signature to the landowner's copy nobody may put another person in the signer's place. */
const settledStates = ['with-supervisor', 'approved']

/** @throws Problem invalid-fields when the new address would make another person the signer of a signed job. */
export function refuseOtherSigner(jobs: readonly OpenJob[]): void {
  const signed = jobs.find(({ state }) => settledStates.includes(state))
  const twice = jobs.find(({ isPersonTwice }) => isPersonTwice)
  const message = signed
    ? `Job ${signed.number} is signed under the address there is now. It can change once the job is sent or returned.`
    : twice && `Job ${twice.number} has another producer with this address. Each signer needs an own address.`
  if (message)
    throw new Problem('invalid-fields', { detail: message, fields: [{ pointer: '/email', message }] })
}
