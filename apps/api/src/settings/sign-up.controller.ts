import { Controller, Get } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { signUpResponse } from '@thudline/contracts';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { InstallationService } from './installation.service';

class SignUpResponseDto extends createZodDto(signUpResponse) {}

@ApiTags('accounts')
@Controller('api/sign-up')
export class SignUpController {
  constructor(private readonly installation: InstallationService) {}

  @Get()
  @Access.anyone()
  @ZodResponse({ status: 200, type: SignUpResponseDto })
  async get() {
    const { signUp } = await this.installation.get();
    return { signUp };
  }
}
