/** A part that could be worked out. */
export interface PartReady<Value> {
  ok: true
  value: Value
}

/** A part whose own input is missing or wrong. `field` is the path in the plan, such as `ramp.gradeRunPerRise`. */
export interface PartFailed {
  ok: false
  field: string
  message: string
}

/** A part that is right in itself, yet needs earlier parts first. */
export interface PartWaiting {
  ok: false
  waitingFor: string[]
}

export type PartResult<Value> = PartReady<Value> | PartFailed | PartWaiting
