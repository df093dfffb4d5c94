import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import {
  CreateRoomDto,
  ListRoomsResponseDto,
  RoomResponseDto,
  RoomTrendDto,
  RoomTrendResponseDto,
  UpdateRoomDto,
} from './dto/room.dto';
import { RoomTrends } from './room-trends';
import { RoomsService } from './rooms.service';

@ApiTags('rooms')
@Controller('api/rooms')
@Access.signedIn()
export class RoomsController {
  constructor(
    private readonly rooms: RoomsService,
    private readonly trends: RoomTrends,
  ) {}

  @Get()
  @ZodResponse({ status: 200, type: ListRoomsResponseDto })
  list(@CurrentViewer() viewer: Viewer) {
    return this.rooms.list(viewer);
  }

  @Post()
  @ZodResponse({ status: 201, type: RoomResponseDto })
  create(@CurrentViewer() viewer: Viewer, @Body() body: CreateRoomDto) {
    return this.rooms.create(viewer, body);
  }

  @Get(':roomId')
  @Access.room('read')
  @ZodResponse({ status: 200, type: RoomResponseDto })
  get(@Param('roomId') roomId: string) {
    return this.rooms.get(roomId);
  }

  @Patch(':roomId')
  @ZodResponse({ status: 200, type: RoomResponseDto })
  update(@CurrentViewer() viewer: Viewer, @Param('roomId') roomId: string, @Body() body: UpdateRoomDto) {
    return this.rooms.update(viewer, roomId, body);
  }

  @Delete(':roomId')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The room and its log are gone; its takes stay.' })
  remove(@CurrentViewer() viewer: Viewer, @Param('roomId') roomId: string): Promise<void> {
    return this.rooms.remove(viewer, roomId);
  }

  @Get(':roomId/trend')
  @Access.room('read')
  @ZodResponse({ status: 200, type: RoomTrendResponseDto })
  trend(@Param('roomId') roomId: string, @Query() query: RoomTrendDto) {
    return this.trends.get(roomId, query);
  }
}
