import { healthResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class HealthResponseDto extends createZodDto(healthResponse) {}
