import { mailChoiceResponse, readMailChoiceRequest, setMailChoiceRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ReadMailChoiceDto extends createZodDto(readMailChoiceRequest) {}
export class SetMailChoiceDto extends createZodDto(setMailChoiceRequest) {}
export class MailChoiceResponseDto extends createZodDto(mailChoiceResponse) {}
