import { Controller, Get, Param, Query, Req, Res } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { Access } from '../access/access.decorator';
import { PeaksDto } from './dto/peaks.dto';
import { TakePeaksService } from './take-peaks.service';

@ApiTags('sound')
@Controller('api/takes/:id/peaks')
export class PeaksController {
  constructor(private readonly peaks: TakePeaksService) {}

  @Get()
  @Access.take('figures')
  @ApiProduces('application/octet-stream')
  @ApiOkResponse({ description: 'Int8, lowest and highest of each step, one track after the other.' })
  @ApiResponse({ status: 304, description: 'The caller has it already.' })
  async get(
    @Param('id') takeId: string,
    @Query() { steps }: PeaksDto,
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    const report = await this.peaks.report(takeId);
    response.set({ 'Cache-Control': 'private, no-cache', ETag: `"${report.measurement.id}-${steps}"` });
    if (request.fresh) {
      response.status(304).end();
      return;
    }
    const outline = await this.peaks.outline(report, steps);
    response.set({
      'X-Steps': String(outline.steps),
      'X-Tracks': String(outline.tracks.length),
      'X-Duration-S': String(report.summary.durationS),
    });
    response.type('application/octet-stream').send(Buffer.from(outline.bytes));
  }
}
