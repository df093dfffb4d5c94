import { Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { MeasurementResponseDto } from './dto/measurement.dto';
import { measurementResponseOf } from './measurement.mapper';
import { MeasurementsService } from './measurements.service';

@ApiTags('measuring')
@Controller('api/takes/:id/measurement')
export class MeasurementsController {
  constructor(private readonly measurements: MeasurementsService) {}

  /** For whoever waits for the sheet; guests open one that is there. */
  @Get()
  @Access.take('own')
  @ZodResponse({ status: 200, type: MeasurementResponseDto })
  async get(@Param('id') takeId: string) {
    return measurementResponseOf(await this.measurements.getLatest(takeId));
  }

  @Post('again')
  @Access.take('change')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'It waits to be measured; what there is of it stays.' })
  again(@Param('id') takeId: string): Promise<void> {
    return this.measurements.again(takeId);
  }

  @Post('cancel')
  @Access.take('change')
  @HttpCode(204)
  @ApiNoContentResponse({
    description: 'It is not measured any further; what has ended already stays as it is.',
  })
  cancel(@Param('id') takeId: string): Promise<void> {
    return this.measurements.cancel(takeId);
  }
}
