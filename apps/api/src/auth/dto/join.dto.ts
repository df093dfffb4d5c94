import { joinRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class JoinDto extends createZodDto(joinRequest) {}
