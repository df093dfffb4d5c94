import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { TakeRights } from '../access/take-rights';
import { CurrentRights, CurrentViewer, Viewer } from '../access/viewer';
import {
  CreateTryOutDto,
  ListTryOutsResponseDto,
  TryOutRankingDto,
  TryOutRankingResponseDto,
  TryOutResponseDto,
  UpdateTryOutDto,
  UpdateTryOutPlaceDto,
} from './dto/try-out.dto';
import { TryOutRankingService } from './try-out-ranking.service';
import { TryOutsService } from './try-outs.service';

/** What changes one is its owner's alone: the service answers 404 to everybody else. */
@ApiTags('try-outs')
@Controller('api/tryouts')
export class TryOutsController {
  constructor(
    private readonly tryOuts: TryOutsService,
    private readonly rankings: TryOutRankingService,
  ) {}

  @Get()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: ListTryOutsResponseDto })
  list(@CurrentViewer() viewer: Viewer) {
    return this.tryOuts.list(viewer);
  }

  @Post()
  @Access.signedIn()
  @ZodResponse({ status: 201, type: TryOutResponseDto })
  create(@CurrentViewer() viewer: Viewer, @Body() body: CreateTryOutDto) {
    return this.tryOuts.create(viewer, body);
  }

  @Get(':id')
  @Access.tryOut('read')
  @ZodResponse({ status: 200, type: TryOutResponseDto })
  get(@Param('id') id: string, @CurrentRights() rights: TakeRights) {
    return this.tryOuts.get(id, rights);
  }

  @Patch(':id')
  @Access.signedIn()
  @ZodResponse({ status: 200, type: TryOutResponseDto })
  update(@CurrentViewer() viewer: Viewer, @Param('id') id: string, @Body() body: UpdateTryOutDto) {
    return this.tryOuts.update(viewer, id, body);
  }

  @Delete(':id')
  @Access.signedIn()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The try-out is gone; its takes stay.' })
  remove(@CurrentViewer() viewer: Viewer, @Param('id') id: string): Promise<void> {
    return this.tryOuts.remove(viewer, id);
  }

  @Patch(':id/places/:placeId')
  @Access.signedIn()
  @ZodResponse({ status: 200, type: TryOutResponseDto })
  updatePlace(
    @CurrentViewer() viewer: Viewer,
    @Param('id') id: string,
    @Param('placeId') placeId: string,
    @Body() body: UpdateTryOutPlaceDto,
  ) {
    return this.tryOuts.updatePlace(viewer, { id, placeId }, body);
  }

  /** The take stays among the takes. */
  @Delete(':id/places/:placeId')
  @Access.signedIn()
  @ZodResponse({ status: 200, type: TryOutResponseDto })
  removePlace(@CurrentViewer() viewer: Viewer, @Param('id') id: string, @Param('placeId') placeId: string) {
    return this.tryOuts.removePlace(viewer, { id, placeId });
  }

  @Get(':id/ranking')
  @Access.tryOut('read')
  @ZodResponse({ status: 200, type: TryOutRankingResponseDto })
  rank(@Param('id') id: string, @Query() query: TryOutRankingDto) {
    return this.rankings.rank(id, query);
  }
}
