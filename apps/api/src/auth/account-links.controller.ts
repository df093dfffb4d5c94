import { Body, Controller, HttpCode, Post, Req } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request } from 'express';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { AccountLinksService } from './account-links.service';
import { ChangePasswordDto, ForgotDto, ResetDto, VerifyDto } from './dto/passwords.dto';

@ApiTags('accounts')
@Controller('api/auth')
export class AccountLinksController {
  constructor(private readonly links: AccountLinksService) {}

  @Post('verify')
  @Access.anyone()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The address is this person’s.' })
  verify(@Body() { token }: VerifyDto, @Req() request: Request): Promise<void> {
    return this.links.verify(token, request.ip ?? '');
  }

  @Post('verify/resend')
  @Access.signedIn()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'Another mail is on its way, unless the address is verified.' })
  resend(@CurrentViewer() viewer: Viewer): Promise<void> {
    return this.links.resendVerification(viewer);
  }

  @Post('forgot')
  @Access.anyone()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'If there is such an account, a mail is on its way.' })
  forgot(@Body() body: ForgotDto, @Req() request: Request): Promise<void> {
    return this.links.forgot(body, request.ip ?? '');
  }

  @Post('reset')
  @Access.anyone()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The password is the new one, and every session is over.' })
  reset(@Body() body: ResetDto, @Req() request: Request): Promise<void> {
    return this.links.reset(body, request.ip ?? '');
  }

  @Post('password')
  @Access.signedIn()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The password is the new one, and every other session is over.' })
  changePassword(
    @CurrentViewer() viewer: Viewer,
    @Body() body: ChangePasswordDto,
    @Req() request: Request,
  ): Promise<void> {
    return this.links.changePassword(viewer, body, request.ip ?? '');
  }
}
