import { BeforeApplicationShutdown, Injectable, Logger, OnApplicationBootstrap } from '@nestjs/common';
import { eventNames } from '@thudline/contracts';
import { SessionsService } from '../auth/sessions.service';
import { DatabaseNotices, TakeAddedNotice } from './database-notices';
import { EventStream } from './event-stream';
import { MeasurementStates } from './measurement-states';

/** Proxies commonly close a line after 30 to 60 silent seconds (common practice, no source). */
const beatMs = 20_000;

/** More tabs than anybody reads; a browser itself opens six to one server, or a hundred over HTTP/2 (common practice, no source). */
export const mostStreamsOfSession = 20;

/** Every open stream of this process, and what is passed on to which. */
@Injectable()
export class EventStreams implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger('Events');
  private readonly streams = new Set<EventStream>();
  private changed = new Set<string>();
  private isTelling = false;
  private isBeating = false;
  private beating: NodeJS.Timeout | undefined;

  constructor(
    private readonly notices: DatabaseNotices,
    private readonly states: MeasurementStates,
    private readonly sessions: SessionsService,
  ) {}

  onApplicationBootstrap(): void {
    this.notices.listen({
      onMeasurement: (takeId) => this.tell([takeId]),
      onTakeAdded: (notice) => this.tellOfTake(notice),
      onNotes: (takeId) => this.tellOfNotes(takeId),
      onGap: () => {
        const takeIds = [...this.streams].flatMap((stream) => [...stream.takeIds]);
        this.tell(takeIds);
        for (const takeId of new Set(takeIds)) this.tellOfNotes(takeId);
      },
    });
    this.beating = setInterval(() => void this.beat(), beatMs);
  }

  /** Open streams would keep the server from closing; browsers connect again, to whoever is there then. */
  beforeApplicationShutdown(): void {
    clearInterval(this.beating);
    for (const stream of this.streams) stream.end();
  }

  /** Starts with the full state; changes from then on follow. */
  async add(stream: EventStream): Promise<void> {
    this.streams.add(stream);
    const { sessionId } = stream.viewer;
    const ofSession = [...this.streams].filter(({ viewer }) => viewer.sessionId === sessionId);
    for (const oldest of ofSession.slice(0, -mostStreamsOfSession)) this.close(oldest);
    for (const event of await this.states.of([...stream.takeIds])) stream.send(eventNames.measurement, event);
  }

  remove(stream: EventStream): void {
    this.streams.delete(stream);
  }

  /** Changes that come while the state is read are told together, as it is then. */
  private tell(takeIds: string[]): void {
    for (const takeId of takeIds) if (this.isAwaited(takeId)) this.changed.add(takeId);
    if (this.isTelling || this.changed.size === 0) return;
    this.isTelling = true;
    this.tellChanged()
      .catch((error: unknown) => this.logger.error(error, 'Changes could not be told'))
      .finally(() => (this.isTelling = false));
  }

  private async tellChanged(): Promise<void> {
    while (this.changed.size > 0) {
      const takeIds = [...this.changed];
      this.changed = new Set();
      for (const event of await this.states.of(takeIds)) {
        for (const stream of this.streams)
          if (stream.takeIds.has(event.takeId)) stream.send(eventNames.measurement, event);
      }
    }
  }

  private isAwaited(takeId: string): boolean {
    return [...this.streams].some((stream) => stream.takeIds.has(takeId));
  }

  private tellOfTake({ ownerId, ...event }: TakeAddedNotice): void {
    for (const stream of this.streams)
      if (stream.viewer.userId === ownerId) stream.send(eventNames.takeAdded, event);
  }

  private tellOfNotes(takeId: string): void {
    for (const stream of this.streams)
      if (stream.takeIds.has(takeId)) stream.send(eventNames.notes, { takeId });
  }

  private close(stream: EventStream): void {
    this.streams.delete(stream);
    stream.end();
  }

  /** Shows that the line is alive, to whoever listens and to ourselves. One beat waits for the other. */
  async beat(): Promise<void> {
    if (this.isBeating) return;
    this.isBeating = true;
    try {
      await this.endThoseOver();
      for (const stream of this.streams) stream.beat();
      await this.notices.check();
    } finally {
      this.isBeating = false;
    }
  }

  /** Whoever signed out, or was locked out, hears nothing more. */
  private async endThoseOver(): Promise<void> {
    try {
      const asked = [...this.streams];
      const live = await this.sessions.liveAmong([...new Set(asked.map(({ viewer }) => viewer.sessionId))]);
      for (const stream of asked) if (!live.has(stream.viewer.sessionId)) this.close(stream);
    } catch (error) {
      this.logger.warn(error, 'It could not be told whose session is over; the next beat asks again');
    }
  }
}
