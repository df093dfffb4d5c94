import { changePasswordRequest, forgotRequest, resetRequest, verifyRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class ForgotDto extends createZodDto(forgotRequest) {}
export class ResetDto extends createZodDto(resetRequest) {}
export class VerifyDto extends createZodDto(verifyRequest) {}
export class ChangePasswordDto extends createZodDto(changePasswordRequest) {}
