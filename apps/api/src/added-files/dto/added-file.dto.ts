import { addedFileResponse, listAddedFilesResponse, makeAddedFileRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class MakeAddedFileDto extends createZodDto(makeAddedFileRequest) {}
export class AddedFileResponseDto extends createZodDto(addedFileResponse) {}
export class ListAddedFilesResponseDto extends createZodDto(listAddedFilesResponse) {}
