import { Body, Controller, Get, Post } from '@nestjs/common'
import { personInputSchema, type PersonInput, type PersonView } from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { PeopleService } from './people.service.js'

@Controller('people')
export class PeopleController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleService,
  ) {}

  @Get()
  @Requires('people:read')
  list(@WhoCalls() { actor }: Caller): Promise<PersonView[]> {
    return this.unitOfWork.run(actor, (tx) => this.people.list(tx))
  }

  @Post()
  @Requires('people:write')
  add(
    @WhoCalls() { actor }: Caller,
    @Body(parsedBy(personInputSchema)) input: PersonInput,
  ): Promise<{ person: PersonView; temporaryPassword: string | null }> {
    return this.unitOfWork.run(actor, (tx) => this.people.add(tx, input))
  }
}
