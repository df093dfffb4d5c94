import { Module } from '@nestjs/common';
import { AccessModule } from '../access/access.module';
import { MailModule } from '../mail/mail.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { NextItemsController } from './next-items.controller';
import { NextItemsService } from './next-items.service';
import { NoteMails } from './note-mails';
import { NoteReadersService } from './note-readers.service';
import { NoteWritingService } from './note-writing.service';
import { NotesController } from './notes.controller';
import { NotesService } from './notes.service';

@Module({
  imports: [AccessModule, MailModule, ThrottleModule],
  controllers: [NotesController, NextItemsController],
  providers: [NotesService, NextItemsService, NoteMails, NoteReadersService, NoteWritingService],
  exports: [NotesService, NoteReadersService],
})
export class NotesModule {}
