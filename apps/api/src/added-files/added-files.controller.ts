import { Body, Controller, Delete, Get, HttpCode, Param, Post, Req, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { sendAttachment, sendWav } from '../sound/send-wav';
import { ObjectStoreService } from '../storage/object-store.service';
import { addedFileName, addedFileResponseOf } from './added-files.mapper';
import { AddedFilesService } from './added-files.service';
import { AddedFileResponseDto, ListAddedFilesResponseDto, MakeAddedFileDto } from './dto/added-file.dto';

@ApiTags('sound')
@Controller('api/takes/:id/added-files')
export class AddedFilesController {
  constructor(
    private readonly added: AddedFilesService,
    private readonly objects: ObjectStoreService,
  ) {}

  @Get()
  @Access.take('download')
  @ZodResponse({ status: 200, type: ListAddedFilesResponseDto })
  async list(@Param('id') takeId: string) {
    const { take, files } = await this.added.list(takeId);
    return { items: files.map((file) => addedFileResponseOf(file, take)) };
  }

  /** The same choice again is the same file. */
  @Post()
  @Access.take('change')
  @HttpCode(200)
  @ZodResponse({ status: 200, type: AddedFileResponseDto })
  async make(@Param('id') takeId: string, @Body() request: MakeAddedFileDto) {
    const { take, file } = await this.added.make(takeId, request);
    return addedFileResponseOf(file, take);
  }

  @Delete(':fileId')
  @Access.take('change')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'It is gone; the recordings stay.' })
  remove(@Param('id') takeId: string, @Param('fileId') fileId: string): Promise<void> {
    return this.added.remove(takeId, fileId);
  }

  @Get(':fileId/file')
  @Access.take('download')
  @ApiProduces('audio/wav')
  @ApiOkResponse({ description: '24-bit WAV, one channel, that says in itself how it was made.' })
  async file(
    @Param('id') takeId: string,
    @Param('fileId') fileId: string,
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    const { take, file, made } = await this.added.getMade(takeId, fileId);
    const open = () => this.objects.stream(made.objectKey);
    await sendAttachment({ ...made, name: addedFileName(file, take), open }, request, response);
  }

  @Get(':fileId/listen.wav')
  @Access.take('listen')
  @ApiProduces('audio/wav')
  @ApiOkResponse({ description: '16-bit WAV, turned down where it is louder than the two as recorded.' })
  async listen(
    @Param('id') takeId: string,
    @Param('fileId') fileId: string,
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    await sendWav(await this.added.listenWav(takeId, fileId), request, response);
  }
}
