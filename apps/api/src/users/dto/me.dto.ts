import { meResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class MeResponseDto extends createZodDto(meResponse) {}
