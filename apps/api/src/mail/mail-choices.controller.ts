import { Body, Controller, HttpCode, Post, Query, Req } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Request } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { FromAnywhere } from '../access/from-anywhere';
import { MailChoiceResponseDto, ReadMailChoiceDto, SetMailChoiceDto } from './dto/mail-choice.dto';
import { MailChoicesService } from './mail-choices.service';

@ApiTags('mail')
@Controller('api/mail-choices')
export class MailChoicesController {
  constructor(private readonly choices: MailChoicesService) {}

  @Post('read')
  @Access.anyone()
  @ZodResponse({ status: 200, type: MailChoiceResponseDto })
  @HttpCode(200)
  read(@Body() { token }: ReadMailChoiceDto, @Req() request: Request) {
    return this.choices.read({ token, address: request.ip ?? '' });
  }

  @Post()
  @Access.anyone()
  @ZodResponse({ status: 200, type: MailChoiceResponseDto })
  @HttpCode(200)
  set(@Body() { token, wanted }: SetMailChoiceDto, @Req() request: Request) {
    return this.choices.set({ token, address: request.ip ?? '' }, wanted);
  }

  /** Mail programs send this by themselves, from no page of ours and without a cookie (RFC 8058). */
  @Post('stop')
  @Access.anyone()
  @FromAnywhere()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'No such mail comes any more.' })
  async stop(@Query() { token }: ReadMailChoiceDto, @Req() request: Request): Promise<void> {
    await this.choices.set({ token, address: request.ip ?? '' }, false);
  }
}
