import { Body, Controller, Delete, Post, Req } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Request } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { DeletionService } from './deletion.service';
import { DeleteAccountDto } from './dto/account.dto';
import { MeResponseDto } from './dto/me.dto';
import { meResponseOf } from './users.mapper';

@ApiTags('accounts')
@Controller('api/me/deletion')
export class DeletionController {
  constructor(private readonly deletion: DeletionService) {}

  /** Asked twice, the first day stands. */
  @Post()
  @Access.signedIn()
  @ZodResponse({ status: 201, type: MeResponseDto })
  async ask(@CurrentViewer() viewer: Viewer, @Body() body: DeleteAccountDto, @Req() request: Request) {
    await this.deletion.ask(viewer, body, request.ip ?? '');
    return meResponseOf(viewer.user, viewer);
  }

  @Delete()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: MeResponseDto })
  async stop(@CurrentViewer() viewer: Viewer, @Req() request: Request) {
    await this.deletion.stop(viewer, request.ip ?? '');
    return meResponseOf(viewer.user, viewer);
  }
}
