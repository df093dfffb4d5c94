import { Controller, Get, Param, Query, Req, Res } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { Access } from '../access/access.decorator';
import { ObjectStoreService } from '../storage/object-store.service';
import { byteRange } from './byte-range';
import { ExcerptDto } from './dto/excerpt.dto';
import { TakeSoundService } from './take-sound.service';
import { sendUntilClosed } from './send-until-closed';

/** Answers are asked for again each time, so that a take that was deleted or hidden can't be heard from a cache. */
const cacheControl = 'private, no-cache';

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
      'Cache-Control': cacheControl,
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
    const { wav, etag } = await this.sound.listenWav(takeId);
    response.set({ 'Cache-Control': cacheControl, ETag: etag, 'Accept-Ranges': 'bytes' }).type('audio/wav');
    if (request.fresh) {
      response.status(304).end();
      return;
    }
    const isSameSound = [undefined, etag].includes(request.get('If-Range'));
    const range = isSameSound ? byteRange(request.get('Range'), wav.sizeBytes) : null;
    const { start, end } = range ?? { start: 0, end: wav.sizeBytes };
    if (range) response.status(206).set('Content-Range', `bytes ${start}-${end - 1}/${wav.sizeBytes}`);
    response.set('Content-Length', String(end - start));
    await sendUntilClosed(wav.bytes({ start, end }), response);
  }

  @Get('files/:fileId')
  @Access.take('download')
  @ApiProduces('audio/wav')
  @ApiOkResponse({ description: 'The recording, bit for bit as it was uploaded.' })
  async file(
    @Param('id') takeId: string,
    @Param('fileId') fileId: string,
    @Req() { method }: Request,
    @Res() response: Response,
  ): Promise<void> {
    const file = await this.sound.getFile(takeId, fileId);
    // The row tells all that HEAD asks for; a stream that nobody reads would hold a connection to the store.
    const bytes = method === 'HEAD' ? null : await this.objects.stream(file.objectKey);
    response.attachment(file.name).type('audio/wav');
    response.set({
      'Cache-Control': cacheControl,
      'Content-Length': String(file.bytes),
      ETag: `"${file.sha256}"`,
    });
    if (bytes) await sendUntilClosed(bytes, response);
    else response.end();
  }
}
