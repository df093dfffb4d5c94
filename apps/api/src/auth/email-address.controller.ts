import { Body, Controller, HttpCode, Post, Req } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request } from 'express';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { ChangeEmailDto, ConfirmEmailDto } from './dto/email-address.dto';
import { EmailAddressService } from './email-address.service';

@ApiTags('accounts')
@Controller('api/auth/email')
export class EmailAddressController {
  constructor(private readonly addresses: EmailAddressService) {}

  @Post()
  @Access.signedIn()
  @HttpCode(204)
  @ApiNoContentResponse({
    description: 'A mail with a link is on its way there, and a notice to the address as it is.',
  })
  ask(@CurrentViewer() viewer: Viewer, @Body() body: ChangeEmailDto): Promise<void> {
    return this.addresses.ask(viewer, body);
  }

  @Post('confirm')
  @Access.anyone()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The address is the new one.' })
  confirm(@Body() { token }: ConfirmEmailDto, @Req() request: Request): Promise<void> {
    return this.addresses.confirm(token, request.ip ?? '');
  }
}
