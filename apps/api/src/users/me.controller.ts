import { Controller, Get } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { MeResponseDto } from './dto/me.dto';
import { meResponseOf } from './users.mapper';

@ApiTags('accounts')
@Controller('api/me')
export class MeController {
  @Get()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: MeResponseDto })
  me(@CurrentViewer() viewer: Viewer) {
    return meResponseOf(viewer.user);
  }
}
