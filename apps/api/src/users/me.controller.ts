import { Body, Controller, Get, Patch } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { MeResponseDto, UpdateMeDto } from './dto/me.dto';
import { MeService } from './me.service';
import { meResponseOf } from './users.mapper';

@ApiTags('accounts')
@Controller('api/me')
export class MeController {
  constructor(private readonly people: MeService) {}

  @Get()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: MeResponseDto })
  me(@CurrentViewer() viewer: Viewer) {
    return meResponseOf(viewer.user, viewer);
  }

  @Patch()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: MeResponseDto })
  async update(@CurrentViewer() viewer: Viewer, @Body() body: UpdateMeDto) {
    await this.people.update(viewer.user, body);
    return meResponseOf(viewer.user, viewer);
  }
}
