import {
  createNoteRequest,
  listNotesResponse,
  nextItem,
  noteThread,
  readNotesRequest,
  tickNextItemRequest,
  updateNoteRequest,
} from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class CreateNoteDto extends createZodDto(createNoteRequest) {}
export class UpdateNoteDto extends createZodDto(updateNoteRequest) {}
export class NoteThreadDto extends createZodDto(noteThread) {}
export class ListNotesResponseDto extends createZodDto(listNotesResponse) {}
export class ReadNotesDto extends createZodDto(readNotesRequest) {}
export class TickNextItemDto extends createZodDto(tickNextItemRequest) {}
export class NextItemDto extends createZodDto(nextItem) {}
