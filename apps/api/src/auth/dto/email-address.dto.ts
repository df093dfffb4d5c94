import { changeEmailRequest, confirmEmailRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ChangeEmailDto extends createZodDto(changeEmailRequest) {}
export class ConfirmEmailDto extends createZodDto(confirmEmailRequest) {}
