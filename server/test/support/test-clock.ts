import { Clock } from '../../src/platform/clock/clock'

/** The real hour, moved by what a test wants. */
export class TestClock extends Clock {
  private aheadMs = 0

  now(): Date {
    return new Date(Date.now() + this.aheadMs)
  }

  moveOn(ms: number): void {
    this.aheadMs += ms
  }
}
