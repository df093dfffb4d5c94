import { EntityManager } from '@mikro-orm/postgresql';
import { Controller, Get, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { HealthResponse } from '@thudline/contracts';
import { Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { MeasureQueue } from '../measuring/measure-queue';
import { ObjectStoreService } from '../storage/object-store.service';
import { HealthResponseDto } from './dto/health.dto';

@ApiTags('health')
@Controller('api/health')
export class HealthController {
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
    private readonly queue: MeasureQueue,
  ) {}

  /** 200 where every part answers, else 503; the same body. */
  @Get()
  @Access.anyone()
  @ZodResponse({ status: 200, type: HealthResponseDto })
  async get(@Res({ passthrough: true }) response: Response): Promise<HealthResponse> {
    const [database, objectStore, queue] = await Promise.all([
      this.em.getConnection().isConnected(),
      this.objects.answers(),
      this.queue.answers(),
    ]);
    const isOk = database && objectStore && queue;
    if (!isOk) response.status(503);
    return {
      status: isOk ? 'ok' : 'failing',
      database: upOrDown(database),
      objectStore: upOrDown(objectStore),
      queue: upOrDown(queue),
    };
  }
}

const upOrDown = (answers: boolean) => (answers ? 'up' : 'down');
