import { Body, Controller, Delete, Get, HttpCode, Inject, Param, Patch, Post, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { AccessService } from '../access/access.service';
import { OpenToReadOnly } from '../access/read-only';
import { notSignedIn } from '../access/viewer';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { Asked, CurrentAsked } from './asked';
import {
  CreateNoteDto,
  ListNotesResponseDto,
  NoteThreadDto,
  ReadNotesDto,
  UpdateNoteDto,
} from './dto/note.dto';
import { becomeGuest } from './guest-cookie';
import { NoteReadersService } from './note-readers.service';
import { NoteWritingService } from './note-writing.service';
import { NotesService } from './notes.service';

/** Notes on a take's sheet. What is written is answered with the whole thread it stands in. */
@ApiTags('notes')
@Controller('api/takes/:id/notes')
export class NotesController {
  constructor(
    private readonly notes: NotesService,
    private readonly writing: NoteWritingService,
    private readonly readers: NoteReadersService,
    private readonly access: AccessService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Behind a link: what the player wrote, and what was written through that link. */
  @Get()
  @Access.take('read')
  @ZodResponse({ status: 200, type: ListNotesResponseDto })
  async list(@CurrentAsked() asked: Asked) {
    return this.notes.list(await this.readers.of(asked));
  }

  /** Guests write under a name of their choice. */
  @Post()
  @Access.take('note')
  @ZodResponse({ status: 201, type: NoteThreadDto })
  async create(
    @CurrentAsked() asked: Asked,
    @Body() body: CreateNoteDto,
    @Res({ passthrough: true }) response: Response,
  ) {
    const { takeId, asker, request } = asked;
    const reader = await this.readers.of(asked);
    const { jwtSecret: secret, isHttps } = this.config;
    if (!reader.userId) reader.guestId = becomeGuest(request, response, { secret, isHttps });
    // What somebody writes who reads all is nobody's who has only a link, even where they opened that one too.
    const share = reader.seesAll ? null : await this.access.shareToNoteBy(asker, takeId);
    const note = await this.writing.create(reader, body, { share, address: request.ip ?? '' });
    return this.notes.thread(reader, note);
  }

  /** Everything up to then was on the page of whoever is signed in. */
  @Post('read')
  @Access.take('read')
  @OpenToReadOnly()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'What was written until then is not new any more.' })
  async markRead(@CurrentAsked() { takeId, asker }: Asked, @Body() { until }: ReadNotesDto): Promise<void> {
    if (!asker.viewer) throw notSignedIn();
    await this.notes.markRead(asker.viewer.user.id, takeId, until);
  }

  @Patch(':noteId')
  @Access.take('note')
  @ZodResponse({ status: 200, type: NoteThreadDto })
  async update(@CurrentAsked() asked: Asked, @Param('noteId') noteId: string, @Body() body: UpdateNoteDto) {
    const reader = await this.readers.of(asked);
    return this.notes.thread(reader, await this.writing.update(reader, noteId, body));
  }

  /** By whoever wrote it, or the take's player. Safe to call twice. */
  @Delete(':noteId')
  @Access.take('note')
  @HttpCode(204)
  @ApiNoContentResponse({
    description: 'The note is gone; whoever took it away can bring it back for 30 days.',
  })
  async remove(@CurrentAsked() asked: Asked, @Param('noteId') noteId: string): Promise<void> {
    await this.writing.remove(await this.readers.of(asked), noteId);
  }

  @Post(':noteId/restore')
  @Access.take('note')
  @ZodResponse({ status: 200, type: NoteThreadDto })
  async restore(@CurrentAsked() asked: Asked, @Param('noteId') noteId: string) {
    const reader = await this.readers.of(asked);
    return this.notes.thread(reader, await this.writing.restore(reader, noteId));
  }
}
