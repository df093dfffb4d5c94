import { reportRequest, reportResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ReportRequestDto extends createZodDto(reportRequest) {}
export class ReportResponseDto extends createZodDto(reportResponse) {}
