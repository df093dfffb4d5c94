import { Controller, Get, HttpCode, Param, Post, Res } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { soundCacheControl } from '../sound/send-wav';
import { sendUntilClosed } from '../sound/send-until-closed';
import { ObjectStoreService } from '../storage/object-store.service';
import { ExportResponseDto, MyExportResponseDto } from './dto/export.dto';
import { exportFileName, exportResponseOf } from './exports.mapper';
import { ExportsService } from './exports.service';

@ApiTags('accounts')
@Controller('api/me/export')
export class ExportsController {
  constructor(
    private readonly exports: ExportsService,
    private readonly objects: ObjectStoreService,
  ) {}

  @Get()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: MyExportResponseDto })
  mine(@CurrentViewer() viewer: Viewer) {
    return this.exports.mine(viewer);
  }

  /** Asked again while one is made, it is the same. */
  @Post()
  @Access.signedIn()
  @HttpCode(200)
  @ZodResponse({ status: 200, type: ExportResponseDto })
  async ask(@CurrentViewer() viewer: Viewer) {
    return exportResponseOf(await this.exports.ask(viewer));
  }

  @Get(':exportId/file')
  @Access.signedIn()
  @ApiProduces('application/zip')
  @ApiOkResponse({ description: 'Everything there is of the account.' })
  async file(
    @CurrentViewer() viewer: Viewer,
    @Param('exportId') exportId: string,
    @Res() response: Response,
  ): Promise<void> {
    const made = await this.exports.getMade(viewer, exportId);
    const bytes = await this.objects.stream(made.objectKey);
    response.attachment(exportFileName(made)).type('application/zip');
    response.set({ 'Cache-Control': soundCacheControl, 'Content-Length': String(made.bytes) });
    await sendUntilClosed(bytes, response);
  }
}
