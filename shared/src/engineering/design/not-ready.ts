import type { PartFailed, PartWaiting } from './part-result.js'

/** Thrown while a part is worked out when something that it needs is not there. */
export class NotReady extends Error {
  constructor(readonly result: PartFailed | PartWaiting) {
    super('message' in result ? result.message : `waiting for ${result.waitingFor.join(', ')}`)
    this.name = 'NotReady'
  }
}
