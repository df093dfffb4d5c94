import { measurementResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class MeasurementResponseDto extends createZodDto(measurementResponse) {}
