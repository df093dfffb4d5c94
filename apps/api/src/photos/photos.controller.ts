import { Controller, Get, Param, Res, StreamableFile } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Response } from 'express';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { PhotosService } from './photos.service';

@ApiTags('photos')
@Controller('api/photos')
export class PhotosController {
  constructor(private readonly photos: PhotosService) {}

  /** A photo never changes; another one has another id. */
  @Get(':photoId')
  @Access.signedIn()
  @ApiProduces('image/jpeg')
  @ApiOkResponse({ description: 'The photo, without place and date.' })
  async read(
    @CurrentViewer() viewer: Viewer,
    @Param('photoId') photoId: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<StreamableFile> {
    const bytes = await this.photos.read(viewer, photoId);
    response.set('Cache-Control', 'private, max-age=3600');
    return new StreamableFile(bytes, { type: 'image/jpeg', length: bytes.length });
  }
}
