import { Body, Controller, Param, Patch } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { OpenToReadOnly } from '../access/read-only';
import { NextItemDto, TickNextItemDto } from './dto/note.dto';
import { NextItemsService } from './next-items.service';

@ApiTags('notes')
@Controller('api/takes/:id/next-items')
export class NextItemsController {
  constructor(private readonly items: NextItemsService) {}

  /** The player has done it, or after all has not. A phone that reads along may tick. */
  @Patch(':itemId')
  @Access.take('own')
  @OpenToReadOnly()
  @ZodResponse({ status: 200, type: NextItemDto })
  tick(@Param('id') takeId: string, @Param('itemId') itemId: string, @Body() { done }: TickNextItemDto) {
    return this.items.tick(takeId, itemId, done);
  }
}
