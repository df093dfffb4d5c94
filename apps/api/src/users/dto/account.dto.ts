import { deleteAccountRequest, listSessionsResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ListSessionsResponseDto extends createZodDto(listSessionsResponse) {}
export class DeleteAccountDto extends createZodDto(deleteAccountRequest) {}
