import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { RoomTrendDto, RoomTrendResponseDto } from './dto/room.dto';
import { RoomTrends } from './room-trends';

@ApiTags('setups')
@Controller('api/setups/:setupId/trend')
@Access.signedIn()
export class SetupTrendsController {
  constructor(private readonly trends: RoomTrends) {}

  /** A figure of every take recorded with a setup. */
  @Get()
  @ZodResponse({ status: 200, type: RoomTrendResponseDto })
  get(@CurrentViewer() viewer: Viewer, @Param('setupId') setupId: string, @Query() query: RoomTrendDto) {
    return this.trends.ofSetup(viewer, setupId, query);
  }
}
