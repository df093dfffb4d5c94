import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query, Req, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { TakeRights } from '../access/take-rights';
import { CurrentRights, CurrentViewer, Viewer } from '../access/viewer';
import { ApiPhotoUpload } from '../photos/api-photo-upload.decorator';
import { receivedPhoto } from '../photos/received-photo';
import {
  CreateRoomChangeDto,
  ListRoomChangesDto,
  ListRoomChangesResponseDto,
  RoomChangeResponseDto,
  UpdateRoomChangeDto,
} from './dto/room.dto';
import { RoomLogService } from './room-log.service';

@ApiTags('rooms')
@Controller('api/rooms/:roomId/changes')
@Access.signedIn()
export class RoomLogController {
  constructor(private readonly log: RoomLogService) {}

  @Get()
  @Access.room('read')
  @ZodResponse({ status: 200, type: ListRoomChangesResponseDto })
  list(
    @Param('roomId') roomId: string,
    @CurrentRights() rights: TakeRights,
    @Query() { told }: ListRoomChangesDto,
  ) {
    return this.log.list(roomId, rights, told);
  }

  @Post()
  @ZodResponse({ status: 201, type: RoomChangeResponseDto })
  create(
    @CurrentViewer() viewer: Viewer,
    @Param('roomId') roomId: string,
    @Body() body: CreateRoomChangeDto,
  ) {
    return this.log.create(viewer, roomId, body);
  }

  @Patch(':changeId')
  @ZodResponse({ status: 200, type: RoomChangeResponseDto })
  update(
    @CurrentViewer() viewer: Viewer,
    @Param() where: { roomId: string; changeId: string },
    @Body() body: UpdateRoomChangeDto,
  ) {
    return this.log.update(viewer, where, body);
  }

  @Delete(':changeId')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The entry is gone from the log; its takes stay.' })
  remove(
    @CurrentViewer() viewer: Viewer,
    @Param() where: { roomId: string; changeId: string },
  ): Promise<void> {
    return this.log.remove(viewer, where);
  }

  /** Takes the place of the photo there was. */
  @Post(':changeId/photo')
  @ApiPhotoUpload()
  @ZodResponse({ status: 200, type: RoomChangeResponseDto })
  async addPhoto(
    @CurrentViewer() viewer: Viewer,
    @Param() where: { roomId: string; changeId: string },
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    await this.log.get(viewer, where);
    return this.log.addPhoto(viewer, where, await receivedPhoto(request, response));
  }

  @Delete(':changeId/photo')
  @ZodResponse({ status: 200, type: RoomChangeResponseDto })
  removePhoto(@CurrentViewer() viewer: Viewer, @Param() where: { roomId: string; changeId: string }) {
    return this.log.removePhoto(viewer, where);
  }
}
