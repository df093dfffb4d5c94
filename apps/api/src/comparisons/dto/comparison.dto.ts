import { comparisonResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ComparisonResponseDto extends createZodDto(comparisonResponse) {}
