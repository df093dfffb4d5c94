import { Controller, Get, Param, Query, Req, Res } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { Access } from '../access/access.decorator';
import { ObjectStoreService } from '../storage/object-store.service';
import { ExcerptDto } from './dto/excerpt.dto';
import { sendAttachment, sendWav, soundCacheControl } from './send-wav';
import { TakeSoundService } from './take-sound.service';

@ApiTags('sound')
@Controller('api/takes/:id')
export class SoundController {
  constructor(
    private readonly sound: TakeSoundService,
    private readonly objects: ObjectStoreService,
  ) {}

  /** Samples as they were recorded: a picture to us, sound to whoever puts them together. */
  @Get('excerpt')
  @Access.take('listen')
  @ApiProduces('application/octet-stream')
  @ApiOkResponse({ description: 'Little-endian float32, one track after the other: kick, overhead.' })
  async excerpt(
    @Param('id') takeId: string,
    @Query() query: ExcerptDto,
    @Res() response: Response,
  ): Promise<void> {
    const { sampleRateHz, startFrame, frames, trackCount, bytes } = await this.sound.excerpt(takeId, query);
    response.set({
      'Cache-Control': soundCacheControl,
      'X-Sample-Rate-Hz': String(sampleRateHz),
      'X-Start-Frame': String(startFrame),
      'X-Frames': String(frames),
      'X-Tracks': String(trackCount),
    });
    response.type('application/octet-stream').send(bytes);
  }

  @Get('listen.wav')
  @Access.take('listen')
  @ApiProduces('audio/wav')
  @ApiOkResponse({ description: '16-bit WAV, one channel a track.' })
  @ApiResponse({ status: 206, description: 'The one range that was asked for.' })
  @ApiResponse({ status: 304, description: 'The caller has it already.' })
  @ApiResponse({ status: 416, description: 'The range begins after the end.' })
  async listen(
    @Param('id') takeId: string,
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    await sendWav(await this.sound.listenWav(takeId), request, response);
  }

  @Get('files/:fileId')
  @Access.take('download')
  @ApiProduces('audio/wav')
  @ApiOkResponse({ description: 'The recording, bit for bit as it was uploaded.' })
  async file(
    @Param('id') takeId: string,
    @Param('fileId') fileId: string,
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    const file = await this.sound.getFile(takeId, fileId);
    const open = () => this.objects.stream(file.objectKey);
    const { name, bytes, sha256 } = file;
    await sendAttachment({ name, bytes, sha256, open }, request, response);
  }
}
