import { Controller, Get } from '@nestjs/common'
import { DataSource } from 'typeorm'
import { Public } from '../auth/public.decorator.js'

@Controller('health')
export class HealthController {
  constructor(private readonly dataSource: DataSource) {}

  /** Ready means: the database answers. */
  @Get()
  @Public()
  async read(): Promise<{ status: 'ready' }> {
    await this.dataSource.query('select 1')
    return { status: 'ready' }
  }
}
