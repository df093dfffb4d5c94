import { signInRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class SignInDto extends createZodDto(signInRequest) {}
