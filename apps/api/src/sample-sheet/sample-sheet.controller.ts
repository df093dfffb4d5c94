import { EntityManager } from '@mikro-orm/postgresql';
import { Controller, Get } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { SampleSheetResponseDto } from './dto/sample-sheet.dto';
import { sampleTakeId } from './sample-take';

@ApiTags('shares')
@Controller('api/sample-sheet')
export class SampleSheetController {
  constructor(private readonly em: EntityManager) {}

  @Get()
  @Access.anyone()
  @ZodResponse({ status: 200, type: SampleSheetResponseDto })
  async get() {
    return { takeId: await sampleTakeId(this.em) };
  }
}
