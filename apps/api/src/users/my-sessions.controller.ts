import { Controller, Delete, Get, HttpCode, Param } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { SessionResponse } from '@thudline/contracts';
import { ZodResponse } from 'nestjs-zod';
import { Access } from '../access/access.decorator';
import { CurrentViewer, Viewer } from '../access/viewer';
import { deviceWords } from '../auth/device-words';
import { Session } from '../auth/entities/session.entity';
import { SessionsService } from '../auth/sessions.service';
import { ListSessionsResponseDto } from './dto/account.dto';

/** Where somebody is signed in. */
@ApiTags('accounts')
@Controller('api/me/sessions')
export class MySessionsController {
  constructor(private readonly sessions: SessionsService) {}

  @Get()
  @Access.signedIn()
  @ZodResponse({ status: 200, type: ListSessionsResponseDto })
  async list(@CurrentViewer() viewer: Viewer) {
    return { items: (await this.sessions.list(viewer)).map((session) => sessionResponseOf(session, viewer)) };
  }

  @Delete(':sessionId')
  @Access.signedIn()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'That device is signed out.' })
  end(@CurrentViewer() viewer: Viewer, @Param('sessionId') sessionId: string): Promise<void> {
    return this.sessions.endOne(viewer, sessionId);
  }

  @Delete()
  @Access.signedIn()
  @HttpCode(204)
  @ApiNoContentResponse({ description: 'Every device but this one is signed out.' })
  endOthers(@CurrentViewer() { user, sessionId }: Viewer): Promise<void> {
    return this.sessions.endAll(user, sessionId);
  }
}

function sessionResponseOf(session: Session, { sessionId }: Viewer): SessionResponse {
  const { id, userAgent, readOnly, rotatedAt } = session;
  return {
    id,
    device: deviceWords(userAgent ?? null),
    current: id === sessionId,
    readOnly,
    usedAt: rotatedAt.toISOString(),
  };
}
