import {
  listTakesRequest,
  listTakesResponse,
  sameFilesRequest,
  sameFilesResponse,
  takeResponse,
  updateTakeRequest,
} from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class UpdateTakeDto extends createZodDto(updateTakeRequest) {}
export class ListTakesDto extends createZodDto(listTakesRequest) {}
export class TakeResponseDto extends createZodDto(takeResponse) {}
export class ListTakesResponseDto extends createZodDto(listTakesResponse) {}
export class SameFilesDto extends createZodDto(sameFilesRequest) {}
export class SameFilesResponseDto extends createZodDto(sameFilesResponse) {}
