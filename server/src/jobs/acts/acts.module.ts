import { Module } from '@nestjs/common'
import { AccountsModule } from '../../accounts/accounts.module.js'
import { MailModule } from '../../mail/mail.module.js'
import { PacketsModule } from '../../packets/packets.module.js'
import { ReviewsModule } from '../../reviews/reviews.module.js'
import { SignaturesModule } from '../../signatures/signatures.module.js'
import { JobsModule } from '../jobs.module.js'
import { ActNotesService } from './act-notes.service.js'
import { ActNoticesService } from './act-notices.service.js'
import { ActRecordersService } from './act-recorders.service.js'
import { ActsController } from './acts.controller.js'
import { ActsService } from './acts.service.js'
import { JobMailController } from './job-mail.controller.js'
import { LandownerActs } from './landowner-acts.service.js'
import { OfficeActs } from './office-acts.service.js'
import { RecipientsService } from './recipients.service.js'
import { SecondTriesService } from './second-tries.service.js'
import { SupervisorActs } from './supervisor-acts.service.js'

/** Moves jobs. It stands on top of the other domains, and none of them knows it. */
@Module({
  imports: [AccountsModule, JobsModule, MailModule, PacketsModule, ReviewsModule, SignaturesModule],
  controllers: [ActsController, JobMailController],
  providers: [
    ActNotesService,
    ActNoticesService,
    ActRecordersService,
    ActsService,
    LandownerActs,
    OfficeActs,
    RecipientsService,
    SecondTriesService,
    SupervisorActs,
  ],
  exports: [ActsService],
})
export class ActsModule {}
