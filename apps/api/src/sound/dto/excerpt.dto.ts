import { excerptRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ExcerptDto extends createZodDto(excerptRequest) {}
