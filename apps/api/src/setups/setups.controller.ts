import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Req, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { ApiPhotoUpload } from '../photos/api-photo-upload.decorator';
import { receivedPhoto } from '../photos/received-photo';
import { CreateSetupDto, ListSetupsResponseDto, SetupResponseDto, UpdateSetupDto } from './dto/setup.dto';
import { SetupsService } from './setups.service';

@ApiTags('setups')
@Controller('api/setups')
@Access.signedIn()
export class SetupsController {
  constructor(private readonly setups: SetupsService) {}

  @Get()
  @ZodResponse({ status: 200, type: ListSetupsResponseDto })
  list(@CurrentViewer() viewer: Viewer) {
    return this.setups.list(viewer);
  }

  @Post()
  @ZodResponse({ status: 201, type: SetupResponseDto })
  create(@CurrentViewer() viewer: Viewer, @Body() body: CreateSetupDto) {
    return this.setups.create(viewer, body);
  }

  @Get(':setupId')
  @ZodResponse({ status: 200, type: SetupResponseDto })
  get(@CurrentViewer() viewer: Viewer, @Param('setupId') setupId: string) {
    return this.setups.get(viewer, setupId);
  }

  @Patch(':setupId')
  @ZodResponse({ status: 200, type: SetupResponseDto })
  update(@CurrentViewer() viewer: Viewer, @Param('setupId') setupId: string, @Body() body: UpdateSetupDto) {
    return this.setups.update(viewer, setupId, body);
  }

  @Delete(':setupId')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The setup and its photo are gone. Refused while takes have it.' })
  remove(@CurrentViewer() viewer: Viewer, @Param('setupId') setupId: string): Promise<void> {
    return this.setups.remove(viewer, setupId);
  }

  /** Takes the place of the photo there was. */
  @Post(':setupId/photo')
  @ApiPhotoUpload()
  @ZodResponse({ status: 200, type: SetupResponseDto })
  async addPhoto(
    @CurrentViewer() viewer: Viewer,
    @Param('setupId') setupId: string,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    await this.setups.get(viewer, setupId);
    return this.setups.addPhoto(viewer, setupId, await receivedPhoto(request, response));
  }

  @Delete(':setupId/photo')
  @ZodResponse({ status: 200, type: SetupResponseDto })
  removePhoto(@CurrentViewer() viewer: Viewer, @Param('setupId') setupId: string) {
    return this.setups.removePhoto(viewer, setupId);
  }
}
