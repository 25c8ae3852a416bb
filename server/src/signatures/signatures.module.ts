import { Module } from '@nestjs/common'
import { ConsentsService } from './consents.service.js'
import { SignaturesService } from './signatures.service.js'

@Module({
  providers: [ConsentsService, SignaturesService],
  exports: [ConsentsService, SignaturesService],
})
export class SignaturesModule {}
