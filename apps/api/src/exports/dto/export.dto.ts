import { exportResponse, myExportResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ExportResponseDto extends createZodDto(exportResponse) {}
export class MyExportResponseDto extends createZodDto(myExportResponse) {}
