import { listTakesRequest, listTakesResponse, takeResponse, updateTakeRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class UpdateTakeDto extends createZodDto(updateTakeRequest) {}
export class ListTakesDto extends createZodDto(listTakesRequest) {}
export class TakeResponseDto extends createZodDto(takeResponse) {}
export class ListTakesResponseDto extends createZodDto(listTakesResponse) {}
