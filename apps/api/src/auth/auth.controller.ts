import { Body, Controller, HttpCode, Inject, Post, Req, Res, UseGuards } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { MeResponseDto } from '../users/dto/me.dto';
import { User } from '../users/entities/user.entity';
import { meResponseOf } from '../users/users.mapper';
import { accessCookieOf, clearSessionCookies, refreshCookieOf, setSessionCookies } from './auth-cookies';
import { AuthService } from './auth.service';
import { JoinDto } from './dto/join.dto';
import { SignInDto } from './dto/sign-in.dto';
import { SessionsService } from './sessions.service';
import { SignInGuard } from './sign-in.guard';
import { userAgentOf } from './device-words';

@ApiTags('accounts')
@Controller('api/auth')
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly sessions: SessionsService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  @Post('join')
  @Access.anyone()
  @ZodResponse({ status: 201, type: MeResponseDto })
  async join(@Body() body: JoinDto, @Req() request: Request, @Res({ passthrough: true }) response: Response) {
    const user = await this.auth.join(body, request.ip ?? '');
    return this.signedIn(user, true, request, response);
  }

  @Post('sign-in')
  @Access.anyone()
  @UseGuards(SignInGuard)
  @ZodResponse({ status: 200, type: MeResponseDto })
  async signIn(
    @Body() { stay }: SignInDto,
    @Req() request: Request & { user: User },
    @Res({ passthrough: true }) response: Response,
  ) {
    return this.signedIn(request.user, stay, request, response);
  }

  @Post('refresh')
  @Access.anyone()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'New cookies are set.' })
  async refresh(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    const token = refreshCookieOf(request);
    if (!token) throw new AppError('session-ended', 'You are not signed in here. Sign in to go on.');
    setSessionCookies(response, await this.sessions.refresh(token), this.config.isHttps);
  }

  @Post('sign-out')
  @Access.anyone()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The session is over and the cookies are gone.' })
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    await this.sessions.end(refreshCookieOf(request), accessCookieOf(request));
    clearSessionCookies(response, this.config.isHttps);
  }

  private async signedIn(user: User, stay: boolean, request: Request, response: Response) {
    const tokens = await this.sessions.start(user, stay, userAgentOf(request));
    setSessionCookies(response, tokens, this.config.isHttps);
    return meResponseOf(user, { readOnly: false });
  }
}
