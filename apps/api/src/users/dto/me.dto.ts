import { meResponse, updateMeRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class MeResponseDto extends createZodDto(meResponse) {}
export class UpdateMeDto extends createZodDto(updateMeRequest) {}
