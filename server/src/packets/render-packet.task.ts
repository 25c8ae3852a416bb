import { Injectable, Logger, type OnModuleInit } from '@nestjs/common'
import { QueueTasks, type QueueAttempt } from '../platform/queue/queue-tasks.js'
import {
  renderPacketPayloadSchema,
  renderPacketTask,
  type RenderPacketPayload,
} from './render-packet-task.js'
import { RenderPacketService } from './render-packet.service.js'

/** Enters the making of packets in the queue. */
@Injectable()
export class RenderPacketTask implements OnModuleInit {
  private readonly log = new Logger('Packets')

  constructor(
    private readonly tasks: QueueTasks,
    private readonly renderer: RenderPacketService,
  ) {}

  onModuleInit(): void {
    this.tasks.register(renderPacketTask, renderPacketPayloadSchema, (payload, attempt) =>
      this.make(payload, attempt),
    )
  }

  private async make(payload: RenderPacketPayload, { isLast }: QueueAttempt): Promise<void> {
    try {
      await this.renderer.make(payload)
    } catch (error) {
      this.log.error(
        `Packet ${payload.packetId} could not be made`,
        error instanceof Error ? error.stack : String(error),
      )
      if (!isLast) throw error
      await this.renderer.giveUp(payload, error)
    }
  }
}
