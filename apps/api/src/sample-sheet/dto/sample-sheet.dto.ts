import { sampleSheetResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class SampleSheetResponseDto extends createZodDto(sampleSheetResponse) {}
