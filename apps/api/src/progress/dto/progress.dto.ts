import { progressResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ProgressResponseDto extends createZodDto(progressResponse) {}
