import { Controller, Get, Header, Param, Query, Res } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { OptionalViewer, Viewer } from '../access/viewer';
import { ReportRequestDto, ReportResponseDto } from './dto/report.dto';
import { ReportsService } from './reports.service';

@ApiTags('reports')
@Controller('api/takes/:id')
export class ReportsController {
  constructor(private readonly reports: ReportsService) {}

  @Get('report')
  @Access.take('figures')
  @ZodResponse({ status: 200, type: ReportResponseDto })
  get(
    @Param('id') takeId: string,
    @Query() { version }: ReportRequestDto,
    @OptionalViewer() viewer: Viewer | null,
  ) {
    return this.reports.get({ takeId, version, reader: viewer?.user ?? null });
  }

  @Get('pair-spectrum')
  @Access.take('figures')
  @ApiProduces('application/octet-stream')
  @ApiOkResponse({
    description: 'Little-endian float32: Skk, Soo, Re Sko, Im Sko; the report names the bins.',
  })
  @Header('Cache-Control', 'private, no-cache')
  async pairSpectrum(
    @Param('id') takeId: string,
    @Query() { version }: ReportRequestDto,
    @Res() response: Response,
  ): Promise<void> {
    const spectrum = await this.reports.getPairSpectrum({ takeId, version });
    // A report never changes, so its id names the bytes.
    response.set('ETag', `"${spectrum.report.measurement.id}"`).type('application/octet-stream');
    response.send(Buffer.from(spectrum.data));
  }
}
