import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post } from '@nestjs/common';
import { Query, Req, Res, StreamableFile } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { TakeRights } from '../access/take-rights';
import { CurrentRights, CurrentViewer, Viewer } from '../access/viewer';
import { ApiPhotoUpload } from '../photos/api-photo-upload.decorator';
import { receivedPhoto } from '../photos/received-photo';
import {
  CreateRoomDto,
  ListRoomsResponseDto,
  RoomResponseDto,
  RoomTrendDto,
  RoomTrendResponseDto,
  UpdateRoomDto,
} from './dto/room.dto';
import { RoomFiles } from './room-files';
import { RoomTrends } from './room-trends';
import { RoomsService } from './rooms.service';

@ApiTags('rooms')
@Controller('api/rooms')
@Access.signedIn()
export class RoomsController {
  constructor(
    private readonly rooms: RoomsService,
    private readonly trends: RoomTrends,
    private readonly files: RoomFiles,
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
  get(@Param('roomId') roomId: string, @CurrentRights() rights: TakeRights) {
    return this.rooms.get(roomId, rights);
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
  trend(@Param('roomId') roomId: string, @Query() query: RoomTrendDto, @CurrentRights() rights: TakeRights) {
    return this.trends.get(roomId, query, rights);
  }

  /** Takes the place of the photo there was. */
  @Post(':roomId/photo')
  @ApiPhotoUpload()
  @ZodResponse({ status: 200, type: RoomResponseDto })
  async addPhoto(
    @CurrentViewer() viewer: Viewer,
    @Param('roomId') roomId: string,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    await this.rooms.getOwn(viewer, roomId);
    return this.rooms.addPhoto(viewer, roomId, await receivedPhoto(request, response));
  }

  @Delete(':roomId/photo')
  @ZodResponse({ status: 200, type: RoomResponseDto })
  removePhoto(@CurrentViewer() viewer: Viewer, @Param('roomId') roomId: string) {
    return this.rooms.removePhoto(viewer, roomId);
  }

  /** Everything of the room in one file: its measures, its log, every figure over time, its photos. */
  @Get(':roomId/room.zip')
  @ApiProduces('application/zip')
  @ApiOkResponse({ description: 'A ZIP with JSON, CSV and photos.' })
  async file(@CurrentViewer() viewer: Viewer, @Param('roomId') roomId: string): Promise<StreamableFile> {
    const { name, archive } = await this.files.get(viewer, roomId);
    return new StreamableFile(archive, {
      type: 'application/zip',
      disposition: `attachment; filename="${name}"`,
    });
  }
}
