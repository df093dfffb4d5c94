import { Body, Controller, Delete, HttpCode, Inject, Param, Post, Req, Res } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { OpenedShareResponseDto, OpenShareDto } from './dto/share.dto';
import { addShareToCookie } from './share-cookie';
import { openedShareResponseOf } from './shares.mapper';
import { SharesService } from './shares.service';

@ApiTags('shares')
@Controller('api/shares')
export class SharesController {
  constructor(
    private readonly shares: SharesService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Exchanges the token of a link for a cookie, so that no address of the API carries it. */
  @Post('open')
  @Access.anyone()
  @ZodResponse({ status: 200, type: OpenedShareResponseDto })
  async open(
    @Body() { token }: OpenShareDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    const share = await this.shares.open(token, request.ip ?? '');
    const { jwtSecret: secret, isHttps } = this.config;
    addShareToCookie(request, response, share.id, { secret, isHttps });
    return openedShareResponseOf(share);
  }

  @Delete(':shareId')
  @Access.signedIn()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The link opens nothing any more.' })
  end(@CurrentViewer() viewer: Viewer, @Param('shareId') shareId: string): Promise<void> {
    return this.shares.end(viewer, shareId);
  }
}
