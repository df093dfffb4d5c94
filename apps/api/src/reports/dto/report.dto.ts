import { reportResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ReportResponseDto extends createZodDto(reportResponse) {}
