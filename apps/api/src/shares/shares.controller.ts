import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Inject,
  Param,
  Post,
  Query,
  Req,
  Res,
} from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import {
  CreatedShareResponseDto,
  CreateShareDto,
  ListSharesDto,
  ListSharesResponseDto,
  OpenedShareResponseDto,
  OpenShareDto,
  ShareResponseDto,
} from './dto/share.dto';
import { OpeningSharesService } from './opening-shares.service';
import { addShareToCookie, shareIdsOf } from './share-cookie';
import { openedShareResponseOf } from './shares.mapper';
import { SharesService } from './shares.service';

@ApiTags('shares')
@Controller('api/shares')
export class SharesController {
  constructor(
    private readonly shares: SharesService,
    private readonly opening: OpeningSharesService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Every link of the player's, or those of one subject. */
  @Get()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: ListSharesResponseDto })
  list(@CurrentViewer() viewer: Viewer, @Query() query: ListSharesDto) {
    return this.shares.list(viewer, query);
  }

  /** The address is told here and never again. */
  @Post()
  @Access.signedIn()
  @ZodResponse({ status: 201, type: CreatedShareResponseDto })
  create(@CurrentViewer() viewer: Viewer, @Body() body: CreateShareDto) {
    return this.shares.create(viewer, body);
  }

  /** Exchanges the token of a link for a cookie, so that no address of the API carries it. */
  @Post('open')
  @Access.anyone()
  @ZodResponse({ status: 200, type: OpenedShareResponseDto })
  async open(
    @Body() body: OpenShareDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    const { jwtSecret: secret, isHttps } = this.config;
    const shareIds = shareIdsOf(request, secret);
    const share = await this.opening.open(body, { address: request.ip ?? '', shareIds });
    addShareToCookie(request, response, share.id, { secret, isHttps });
    return openedShareResponseOf(share);
  }

  /** Takes its ending back. Safe to call twice. */
  @Post(':shareId/restore')
  @Access.signedIn()
  @ZodResponse({ status: 200, type: ShareResponseDto })
  restore(@CurrentViewer() viewer: Viewer, @Param('shareId') shareId: string) {
    return this.shares.restore(viewer, shareId);
  }

  @Delete(':shareId')
  @Access.signedIn()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'The link opens nothing any more.' })
  end(@CurrentViewer() viewer: Viewer, @Param('shareId') shareId: string): Promise<void> {
    return this.shares.end(viewer, shareId);
  }
}
