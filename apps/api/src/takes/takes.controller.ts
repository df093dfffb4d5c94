import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query, Req, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { OpenToReadOnly } from '../access/read-only';
import { everything, TakeRights } from '../access/take-rights';
import { CurrentRights, CurrentViewer, Viewer } from '../access/viewer';
import {
  ListTakesDto,
  ListTakesResponseDto,
  TakeResponseDto,
  UpdateTakeDto,
  SameFilesDto,
  SameFilesResponseDto,
} from './dto/take.dto';
import { SameFilesService } from './same-files.service';
import { TakeCreationService } from './take-creation.service';
import { TakeListsService } from './take-lists.service';
import { TakesService } from './takes.service';
import { ApiTakeUpload } from './upload/api-take-upload.decorator';
import { TakeUploadsService, textBytes } from './upload/take-uploads.service';
import { UploadQuota } from './upload/upload-quota';

@ApiTags('takes')
@Controller('api/takes')
export class TakesController {
  constructor(
    private readonly takes: TakesService,
    private readonly lists: TakeListsService,
    private readonly files: SameFilesService,
    private readonly creation: TakeCreationService,
    private readonly uploads: TakeUploadsService,
    private readonly quota: UploadQuota,
  ) {}

  @Get()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: ListTakesResponseDto })
  list(@CurrentViewer() viewer: Viewer, @Query() query: ListTakesDto) {
    return this.lists.list(viewer, query);
  }

  @Post()
  @Access.signedIn()
  @ApiTakeUpload()
  @ZodResponse({ status: 201, type: TakeResponseDto })
  async create(
    @CurrentViewer() viewer: Viewer,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    // Where the length is told, what has no room is refused before it is sent.
    await this.quota.check(viewer.user, Number(request.get('Content-Length') ?? 0) - textBytes);
    const created = await this.uploads.receive(request, response, (upload) =>
      this.creation.create(viewer, upload),
    );
    response.status(created.isNew ? 201 : 200);
    return this.takes.whole(created.take, everything);
  }

  /** Asked before sending, so that nobody sends the same take twice without knowing. */
  @Get('same-files')
  @Access.signedIn()
  @ZodResponse({ status: 200, type: SameFilesResponseDto })
  sameFiles(@CurrentViewer() viewer: Viewer, @Query() query: SameFilesDto) {
    return this.files.same(viewer, query);
  }

  @Get(':id')
  @Access.take('read')
  @ZodResponse({ status: 200, type: TakeResponseDto })
  get(@Param('id') id: string, @CurrentRights() rights: TakeRights) {
    return this.takes.get(id, rights);
  }

  /** A phone that reads along may tick. */
  @Patch(':id')
  @Access.take('own')
  @OpenToReadOnly()
  @ZodResponse({ status: 200, type: TakeResponseDto })
  update(@Param('id') id: string, @Body() body: UpdateTakeDto, @CurrentRights() rights: TakeRights) {
    return this.takes.update(id, body, rights);
  }

  /** Safe to call twice. */
  @Post(':id/restore')
  @Access.deletedTake('change')
  @ZodResponse({ status: 200, type: TakeResponseDto })
  restore(@CurrentViewer() viewer: Viewer, @Param('id') id: string, @CurrentRights() rights: TakeRights) {
    return this.takes.restore(viewer, id, rights);
  }

  @Delete(':id')
  @Access.take('change')
  @HttpCode(204)
  @ApiNoContentResponse({
    description: 'The take is gone from every list; it can be brought back for 30 days.',
  })
  remove(@CurrentViewer() viewer: Viewer, @Param('id') id: string): Promise<void> {
    return this.takes.remove(viewer, id);
  }
}
