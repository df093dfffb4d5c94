import { createComplaintRequest, listComplaintsResponse, settleComplaintRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class CreateComplaintDto extends createZodDto(createComplaintRequest) {}
export class ListComplaintsResponseDto extends createZodDto(listComplaintsResponse) {}
export class SettleComplaintDto extends createZodDto(settleComplaintRequest) {}
