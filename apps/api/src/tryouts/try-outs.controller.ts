import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { TakeRights } from '../access/take-rights';
import { CurrentRights, CurrentViewer, Viewer } from '../access/viewer';
import {
  AddTryOutPlacesDto,
  CreateTryOutDto,
  ListTryOutsResponseDto,
  MakeTryOutSetupDto,
  TryOutRankingDto,
  TryOutRankingResponseDto,
  TryOutResponseDto,
  UpdateTryOutDto,
  UpdateTryOutPlaceDto,
} from './dto/try-out.dto';
import { TryOutPlacesService } from './try-out-places.service';
import { TryOutRankingService } from './try-out-ranking.service';
import { TryOutSetupService } from './try-out-setup.service';
import { TryOutsService } from './try-outs.service';

/** What changes one is its owner's alone: the service answers 404 to everybody else. */
@ApiTags('try-outs')
@Controller('api/tryouts')
export class TryOutsController {
  constructor(
    private readonly tryOuts: TryOutsService,
    private readonly places: TryOutPlacesService,
    private readonly rankings: TryOutRankingService,
    private readonly winners: TryOutSetupService,
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

  @Post(':id/restore')
  @Access.signedIn()
  @HttpCode(200)
  @ZodResponse({ status: 200, type: TryOutResponseDto })
  restore(@CurrentViewer() viewer: Viewer, @Param('id') id: string) {
    return this.tryOuts.restore(viewer, id);
  }

  @Post(':id/places')
  @Access.signedIn()
  @ZodResponse({ status: 201, type: TryOutResponseDto })
  addPlaces(@CurrentViewer() viewer: Viewer, @Param('id') id: string, @Body() body: AddTryOutPlacesDto) {
    return this.places.add(viewer, id, body);
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
    return this.places.update(viewer, { id, placeId }, body);
  }

  /** The take stays among the takes. */
  @Delete(':id/places/:placeId')
  @Access.signedIn()
  @ZodResponse({ status: 200, type: TryOutResponseDto })
  removePlace(@CurrentViewer() viewer: Viewer, @Param('id') id: string, @Param('placeId') placeId: string) {
    return this.places.remove(viewer, { id, placeId });
  }

  @Post(':id/places/:placeId/restore')
  @Access.signedIn()
  @HttpCode(200)
  @ZodResponse({ status: 200, type: TryOutResponseDto })
  restorePlace(@CurrentViewer() viewer: Viewer, @Param('id') id: string, @Param('placeId') placeId: string) {
    return this.places.restore(viewer, { id, placeId });
  }

  /** Copies the winner's setup with what was varied; the next upload begins with it. */
  @Post(':id/setup')
  @Access.signedIn()
  @ZodResponse({ status: 201, type: TryOutResponseDto })
  makeSetup(@CurrentViewer() viewer: Viewer, @Param('id') id: string, @Body() body: MakeTryOutSetupDto) {
    return this.winners.make(viewer, id, body);
  }

  /** The setup that stood before stands again. */
  @Delete(':id/setup')
  @Access.signedIn()
  @ZodResponse({ status: 200, type: TryOutResponseDto })
  undoSetup(@CurrentViewer() viewer: Viewer, @Param('id') id: string) {
    return this.winners.undo(viewer, id);
  }

  @Get(':id/ranking')
  @Access.tryOut('read')
  @ZodResponse({ status: 200, type: TryOutRankingResponseDto })
  rank(@Param('id') id: string, @Query() query: TryOutRankingDto) {
    return this.rankings.rank(id, query);
  }
}
