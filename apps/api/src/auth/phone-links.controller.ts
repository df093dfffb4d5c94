import { Body, Controller, Inject, Post, Req, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { MeResponseDto } from '../users/dto/me.dto';
import { meResponseOf } from '../users/users.mapper';
import { accessCookieOf, setSessionCookies } from './auth-cookies';
import { userAgentOf } from './device-words';
import { OpenPhoneLinkDto, PhoneLinkResponseDto } from './dto/phone-links.dto';
import { PhoneLinksService } from './phone-links.service';
import { SessionsService } from './sessions.service';

@ApiTags('accounts')
@Controller('api/auth/phone-links')
export class PhoneLinksController {
  constructor(
    private readonly links: PhoneLinksService,
    private readonly sessions: SessionsService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  @Post()
  @Access.signedIn()
  @ZodResponse({ status: 201, type: PhoneLinkResponseDto })
  make(@CurrentViewer() viewer: Viewer) {
    return this.links.make(viewer);
  }

  /** Signs this browser in to read for half a day; where the same person is signed in wholly, they stay so. */
  @Post('open')
  @Access.anyone()
  @ZodResponse({ status: 200, type: MeResponseDto })
  async open(
    @Body() { token }: OpenPhoneLinkDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    const user = await this.links.open(token, request.ip ?? '');
    const cookie = accessCookieOf(request);
    const viewer = cookie ? await this.sessions.findViewer(cookie) : null;
    if (viewer && viewer.user.id === user.id) return meResponseOf(viewer.user, viewer);
    const tokens = await this.sessions.startReadOnly(user, userAgentOf(request));
    setSessionCookies(response, tokens, this.config.isHttps);
    return meResponseOf(user, { readOnly: true });
  }
}
