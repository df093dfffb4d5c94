import { Readable } from 'node:stream';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { RoomChangeResponse, RoomResponse, trendFigures } from '@thudline/contracts';
import { Viewer } from '../access/viewer';
import { Photo } from '../photos/entities/photo.entity';
import { ObjectStoreService } from '../storage/object-store.service';
import { csvOf } from '../zip/csv';
import { jsonEntry, textEntry, ZipEntry, zipStream } from '../zip/zip-stream';
import { RoomLogService } from './room-log.service';
import { RoomTrends } from './room-trends';
import { RoomsService } from './rooms.service';

const readMe = `Your room, as it was written down and measured.

room.json     its measures
changes.json  its log with what each change did, figures and intervals
changes.csv   the same, a change a row
figures.csv   every figure of every take over time; seconds, dB, dBFS, ms
photos/       photos, without place and date
`;

/** A room in one file. */
@Injectable()
export class RoomFiles {
  constructor(
    private readonly em: EntityManager,
    private readonly rooms: RoomsService,
    private readonly log: RoomLogService,
    private readonly trends: RoomTrends,
    private readonly objects: ObjectStoreService,
  ) {}

  /** @throws {AppError} `not-found` before anything is sent */
  async get(viewer: Viewer, roomId: string): Promise<{ name: string; archive: Readable }> {
    const room = await this.rooms.getOwn(viewer, roomId);
    const { items } = await this.log.list(roomId, { own: true });
    const changes = items.reverse();
    const photos = await this.photosOf(room, changes);
    const slug = room.name
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, '-')
      .replace(/^-|-$/g, '');
    return { name: `${slug || 'room'}.zip`, archive: zipStream(this.entries({ room, changes, photos })) };
  }

  private async *entries({ room, changes, photos }: WholeRoom): AsyncGenerator<ZipEntry> {
    yield textEntry('read me.txt', readMe);
    yield jsonEntry('room.json', room);
    yield jsonEntry('changes.json', changes);
    yield textEntry('changes.csv', changesCsv(changes));
    yield textEntry('figures.csv', await this.figuresCsv(room.id));
    for (const { path, objectKey } of photos)
      yield { path, compress: false, open: () => this.objects.stream(objectKey) };
  }

  private async figuresCsv(roomId: string): Promise<string> {
    const rows: (string | number | null)[][] = [];
    for (const figure of trendFigures)
      for (const point of await this.trends.points(figure, 'room_id', roomId))
        rows.push([
          figure,
          point.recordedAt,
          point.number,
          point.value,
          point.iqr,
          point.setup?.name ?? null,
        ]);
    return csvOf(['figure', 'recorded at', 'take', 'value', 'between the quartiles', 'setup'], rows);
  }

  private async photosOf(room: RoomResponse, changes: readonly RoomChangeResponse[]) {
    const named = [
      { id: room.photo?.id, path: 'photos/room.jpg' },
      ...changes.map(({ photo, number }) => ({ id: photo?.id, path: `photos/change-${number}.jpg` })),
    ];
    const ids = named.flatMap(({ id }) => id ?? []);
    const stored = await this.em.find(Photo, { id: { $in: ids } });
    return named.flatMap(({ id, path }) => {
      const photo = stored.find((each) => each.id === id);
      return photo ? [{ path, objectKey: photo.objectKey }] : [];
    });
  }
}

interface WholeRoom {
  room: RoomResponse;
  changes: readonly RoomChangeResponse[];
  photos: readonly { path: string; objectKey: string }[];
}

function changesCsv(changes: readonly RoomChangeResponse[]): string {
  const takes = (side: RoomChangeResponse['before']) => side.map(({ number }) => number).join(' ');
  const head = [
    'number',
    'day',
    'what',
    'kind',
    'cost',
    'note',
    'takes before',
    'takes after',
    'what it did',
  ];
  return csvOf(
    head,
    changes.map((change) => [
      change.number,
      change.happenedOn,
      change.what,
      change.category,
      change.cost,
      change.note,
      takes(change.before),
      takes(change.after),
      `${change.did.strong} ${change.did.rest}`.trim(),
    ]),
  );
}
