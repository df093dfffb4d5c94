import { Controller, Get, Query, Res } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Response } from 'express';
import { Access } from '../access/access.decorator';
import { AccessService } from '../access/access.service';
import { CurrentViewer, Viewer } from '../access/viewer';
import { EventsDto } from './dto/events.dto';
import { EventStream } from './event-stream';
import { EventStreams } from './event-streams';

@ApiTags('measuring')
@Controller('api/events')
export class EventsController {
  constructor(
    private readonly streams: EventStreams,
    private readonly access: AccessService,
  ) {}

  /** One stream for all takes a tab shows; takes that aren't the caller's are passed over. */
  @Get()
  @Access.signedIn()
  @ApiProduces('text/event-stream')
  @ApiOkResponse({ description: 'Server-sent events `measurement`, `take-added` and `notes`, without end.' })
  async listen(
    @CurrentViewer() viewer: Viewer,
    @Query() { takes }: EventsDto,
    @Res() response: Response,
  ): Promise<void> {
    const own = await this.access.ownAmong(viewer, takes);
    // Whoever left meanwhile closes nothing any more, and would stay in the list for ever.
    if (response.destroyed) return;
    const { user, sessionId } = viewer;
    const stream = new EventStream(response, { userId: user.id, sessionId }, new Set(own));
    response.on('close', () => this.streams.remove(stream));
    await this.streams.add(stream);
  }
}
