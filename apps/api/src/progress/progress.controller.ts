import { Controller, Get } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { ProgressResponseDto } from './dto/progress.dto';
import { ProgressService } from './progress.service';

@ApiTags('takes')
@Controller('api/me/progress')
export class ProgressController {
  constructor(private readonly progress: ProgressService) {}

  @Get()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: ProgressResponseDto })
  mine(@CurrentViewer() viewer: Viewer) {
    return this.progress.of(viewer.user.id);
  }
}
