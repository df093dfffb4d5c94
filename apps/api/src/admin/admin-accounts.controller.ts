import { Body, Controller, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { AdminAccountsService } from './admin-accounts.service';
import {
  AccountResponseDto,
  InviteDto,
  ListAccountsDto,
  ListAccountsResponseDto,
  UpdateAccountDto,
} from './dto/admin.dto';

@ApiTags('admin')
@Controller('api/admin')
export class AdminAccountsController {
  constructor(private readonly accounts: AdminAccountsService) {}

  @Get('accounts')
  @Access.role('admin')
  @ZodResponse({ status: 200, type: ListAccountsResponseDto })
  list(@Query() query: ListAccountsDto) {
    return this.accounts.list(query);
  }

  @Patch('accounts/:userId')
  @Access.role('admin')
  @ZodResponse({ status: 200, type: AccountResponseDto })
  update(@CurrentViewer() viewer: Viewer, @Param('userId') userId: string, @Body() body: UpdateAccountDto) {
    return this.accounts.update(viewer, userId, body);
  }

  @Post('accounts/:userId/verification')
  @Access.role('admin')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'Another mail is on its way, unless the address is verified.' })
  verify(@Param('userId') userId: string): Promise<void> {
    return this.accounts.resendVerification(userId);
  }

  @Post('invitations')
  @Access.role('admin')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'A mail with a link is on its way.' })
  invite(@CurrentViewer() viewer: Viewer, @Body() body: InviteDto): Promise<void> {
    return this.accounts.invite(viewer, body);
  }
}
