import { EntitySchema } from '@mikro-orm/core';
import { AddedFile } from '../added-files/entities/added-file.entity';
import { AuditEvent } from '../audit/entities/audit-event.entity';
import { Session } from '../auth/entities/session.entity';
import { Export } from '../exports/entities/export.entity';
import { MailRefusal } from '../mail/entities/mail-refusal.entity';
import { Complaint } from '../complaints/entities/complaint.entity';
import { Measurement } from '../measuring/entities/measurement.entity';
import { NextItem } from '../notes/entities/next-item.entity';
import { Note } from '../notes/entities/note.entity';
import { ReadMark } from '../notes/entities/read-mark.entity';
import { Photo } from '../photos/entities/photo.entity';
import { PairSpectrum } from '../reports/entities/pair-spectrum.entity';
import { Report } from '../reports/entities/report.entity';
import { RoomChangeTake } from '../rooms/entities/room-change-take.entity';
import { RoomChange } from '../rooms/entities/room-change.entity';
import { Room } from '../rooms/entities/room.entity';
import { Setting } from '../settings/entities/setting.entity';
import { Setup } from '../setups/entities/setup.entity';
import { Share } from '../shares/entities/share.entity';
import { TakeFile } from '../takes/entities/take-file.entity';
import { TakeTrack } from '../takes/entities/take-track.entity';
import { Take } from '../takes/entities/take.entity';
import { Throttle } from '../throttle/entities/throttle.entity';
import { OneTimeToken } from '../tokens/entities/one-time-token.entity';
import { TryOutPlace } from '../tryouts/entities/try-out-place.entity';
import { TryOut } from '../tryouts/entities/try-out.entity';
import { User } from '../users/entities/user.entity';

/** Named, since the compiler writes no type as long as all of theirs together. */
export const entities: EntitySchema[] = [
  User,
  Session,
  Room,
  RoomChange,
  RoomChangeTake,
  Take,
  TakeFile,
  TakeTrack,
  AddedFile,
  Measurement,
  Report,
  PairSpectrum,
  AuditEvent,
  Throttle,
  Share,
  Setting,
  OneTimeToken,
  TryOut,
  TryOutPlace,
  Photo,
  Setup,
  Export,
  MailRefusal,
  Note,
  NextItem,
  ReadMark,
  Complaint,
];
