import { Body, Controller, Get, HttpCode, Param, Patch, Post } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { Asked, CurrentAsked } from '../notes/asked';
import { NoteReadersService } from '../notes/note-readers.service';
import { ComplaintsService } from './complaints.service';
import { CreateComplaintDto, ListComplaintsResponseDto, SettleComplaintDto } from './dto/complaint.dto';

@ApiTags('complaints')
@Controller('api')
export class ComplaintsController {
  constructor(
    private readonly complaints: ComplaintsService,
    private readonly readers: NoteReadersService,
  ) {}

  /** Whoever may read a sheet may say what is wrong with it, or with a note on it. */
  @Post('takes/:id/complaints')
  @Access.take('read')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'Whoever runs the installation looks at it.' })
  async create(@CurrentAsked() asked: Asked, @Body() body: CreateComplaintDto): Promise<void> {
    await this.complaints.create(await this.readers.of(asked), body, asked.request.ip ?? '');
  }

  @Get('admin/complaints')
  @Access.role('admin')
  @ZodResponse({ status: 200, type: ListComplaintsResponseDto })
  list() {
    return this.complaints.list();
  }

  /** It was looked at; the note goes or stays. Safe to call twice. */
  @Patch('admin/complaints/:complaintId')
  @Access.role('admin')
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'It is off the list of what is open.' })
  settle(
    @CurrentViewer() viewer: Viewer,
    @Param('complaintId') complaintId: string,
    @Body() body: SettleComplaintDto,
  ): Promise<void> {
    return this.complaints.settle(viewer, complaintId, body);
  }
}
