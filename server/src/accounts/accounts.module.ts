import { Global, Module } from '@nestjs/common'
import { MailModule } from '../mail/mail.module.js'
import { CallerLookup } from '../platform/auth/caller.js'
import { AccountController } from './account.controller.js'
import { EntryController } from './entry.controller.js'
import { EntryLinksService } from './entry-links.service.js'
import { EntryService } from './entry.service.js'
import { PasswordService } from './password.service.js'
import { PeopleController } from './people.controller.js'
import { PeopleService } from './people.service.js'
import { SessionCallers } from './session-callers.service.js'
import { SessionController } from './session.controller.js'
import { SessionViewService } from './session-view.service.js'
import { SessionsController } from './sessions.controller.js'
import { SessionsService } from './sessions.service.js'
import { SignInService } from './sign-in.service.js'
import { SignInThrottle } from './sign-in-throttle.service.js'

/** Global, since the guard before every route asks it who calls. */
@Global()
@Module({
  imports: [MailModule],
  controllers: [AccountController, EntryController, PeopleController, SessionController, SessionsController],
  providers: [
    EntryLinksService,
    EntryService,
    PasswordService,
    PeopleService,
    SessionViewService,
    SessionsService,
    SignInService,
    SignInThrottle,
    { provide: CallerLookup, useClass: SessionCallers },
  ],
  exports: [CallerLookup, EntryLinksService, PeopleService],
})
export class AccountsModule {}
