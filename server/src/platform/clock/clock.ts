import { Injectable } from '@nestjs/common'

/** The one source of the present instant, so that a test can stand at any hour. */
export abstract class Clock {
  abstract now(): Date
}

@Injectable()
export class SystemClock extends Clock {
  now(): Date {
    return new Date()
  }
}
