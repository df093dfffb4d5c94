import { openPhoneLinkRequest, phoneLinkResponse } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class OpenPhoneLinkDto extends createZodDto(openPhoneLinkRequest) {}
export class PhoneLinkResponseDto extends createZodDto(phoneLinkResponse) {}
