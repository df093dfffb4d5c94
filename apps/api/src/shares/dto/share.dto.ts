import {
  createdShareResponse,
  createShareRequest,
  listSharesRequest,
  listSharesResponse,
  openedShareResponse,
  openShareRequest,
  shareResponse,
} from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class CreateShareDto extends createZodDto(createShareRequest) {}
export class CreatedShareResponseDto extends createZodDto(createdShareResponse) {}
export class ListSharesDto extends createZodDto(listSharesRequest) {}
export class ListSharesResponseDto extends createZodDto(listSharesResponse) {}
export class ShareResponseDto extends createZodDto(shareResponse) {}
export class OpenShareDto extends createZodDto(openShareRequest) {}
export class OpenedShareResponseDto extends createZodDto(openedShareResponse) {}
