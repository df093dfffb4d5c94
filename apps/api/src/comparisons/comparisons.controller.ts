import { Controller, Get, Param } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { TakeRights } from '../access/take-rights';
import { CurrentRights, OptionalViewer, Viewer } from '../access/viewer';
import { ComparisonsService } from './comparisons.service';
import { ComparisonResponseDto } from './dto/comparison.dto';

@ApiTags('comparisons')
@Controller('api/takes/:id/compare/:otherId')
export class ComparisonsController {
  constructor(private readonly comparisons: ComparisonsService) {}

  /** What changed from the first take to the other, and how surely. */
  @Get()
  @Access.comparison('read')
  @ZodResponse({ status: 200, type: ComparisonResponseDto })
  get(
    @Param('id') beforeId: string,
    @Param('otherId') afterId: string,
    @OptionalViewer() viewer: Viewer | null,
    @CurrentRights() rights: TakeRights,
  ) {
    return this.comparisons.compare({ beforeId, afterId, reader: viewer?.user ?? null, rights });
  }
}
