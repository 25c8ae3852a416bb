import { Module } from '@nestjs/common'
import { DesignsModule } from '../designs/designs.module.js'
import { JobsModule } from '../jobs/jobs.module.js'
import { SignaturesModule } from '../signatures/signatures.module.js'
import { SurveysModule } from '../surveys/surveys.module.js'
import { MakePacketService } from './make-packet.service.js'
import { PacketAccessService } from './packet-access.service.js'
import { PacketActsController } from './packet-acts.controller.js'
import { PacketDraftService } from './packet-draft.service.js'
import { PacketFileService } from './packet-file.service.js'
import { PacketRendererService } from './packet-renderer.service.js'
import { PacketViewService } from './packet-view.service.js'
import { PacketsController } from './packets.controller.js'
import { PacketsService } from './packets.service.js'
import { PageReadingService } from './page-reading.service.js'
import { RenderPacketService } from './render-packet.service.js'
import { RenderPacketTask } from './render-packet.task.js'
import { PacketEvidenceService } from './source/packet-evidence.service.js'
import { PacketSourceService } from './source/packet-source.service.js'
import { TechnicalCheckService } from './technical-check.service.js'

@Module({
  imports: [DesignsModule, JobsModule, SignaturesModule, SurveysModule],
  controllers: [PacketActsController, PacketsController],
  providers: [
    MakePacketService,
    PacketAccessService,
    PacketDraftService,
    PacketEvidenceService,
    PacketFileService,
    PacketRendererService,
    PacketSourceService,
    PacketViewService,
    PacketsService,
    PageReadingService,
    RenderPacketService,
    RenderPacketTask,
    TechnicalCheckService,
  ],
  exports: [PacketsService],
})
export class PacketsModule {}
