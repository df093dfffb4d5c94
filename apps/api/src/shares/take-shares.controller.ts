import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { CreatedShareResponseDto, CreateShareDto, ListSharesResponseDto } from './dto/share.dto';
import { SharesService } from './shares.service';

@ApiTags('shares')
@Controller('api/takes/:id/shares')
export class TakeSharesController {
  constructor(private readonly shares: SharesService) {}

  @Get()
  @Access.take('own')
  @ZodResponse({ status: 200, type: ListSharesResponseDto })
  list(@Param('id') takeId: string) {
    return this.shares.list(takeId);
  }

  /** The address is told here and never again. */
  @Post()
  @Access.take('change')
  @ZodResponse({ status: 201, type: CreatedShareResponseDto })
  create(@CurrentViewer() viewer: Viewer, @Param('id') takeId: string, @Body() body: CreateShareDto) {
    return this.shares.create(viewer, takeId, body);
  }
}
