import { Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { AdminWorkService } from './admin-work.service';
import { ListFailedWorkResponseDto } from './dto/admin.dto';

@ApiTags('admin')
@Controller('api/admin/work')
export class AdminWorkController {
  constructor(private readonly work: AdminWorkService) {}

  @Get()
  @Access.role('admin')
  @ZodResponse({ status: 200, type: ListFailedWorkResponseDto })
  async list() {
    return { items: await this.work.list() };
  }

  @Post(':kind/:id/retry')
  @Access.role('admin')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'It waits for its turn again.' })
  retry(
    @CurrentViewer() viewer: Viewer,
    @Param('kind') kind: string,
    @Param('id') id: string,
  ): Promise<void> {
    return this.work.retry(viewer, kind, id);
  }
}
