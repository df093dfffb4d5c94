import type { Finding, ReportFigures, RoomReport } from '../report/reportTypes';
import { counted, decimalText } from './words';

/** How a loud snare dies away in the room; nothing where that wasn't measured. */
export function roomFindings({ room }: ReportFigures): Finding[] {
  if (!room) return [];
  return [room.decayS === null ? cannotTell(room) : told(room.decayS, room.earlyS)];
}

function told(decayS: number, earlyS: number | null): Finding {
  const early = earlyS === null ? '' : `, the early part in ${decimalText(earlyS, 2)}`;
  return {
    topic: 'room',
    status: 'good',
    sentence: `A loud snare dies away in ${decimalText(decayS, 2)} s here (60 dB)${early}; compare it with other takes of this snare.`,
    why: 'It is for comparing takes of one snare in one room: the drum’s own ringing and the microphone’s nearness are part of it, so it is no standard room measurement.',
    next: 'Note it, to see what panels or moving the kit do.',
  };
}

function cannotTell({ reason, snareHits }: RoomReport): Finding {
  const why =
    reason === 'cut-short'
      ? 'hits follow too soon or noise hides it'
      : `${counted(snareHits, 'loud snare hit')} ${snareHits === 1 ? 'stands' : 'stand'} alone`;
  return {
    topic: 'room',
    status: 'cannot-tell',
    sentence: `Can’t tell how the room dies away: ${why}; play six hard snare hits with two seconds between.`,
    why: 'The room is heard only where a hit rings out before the next one.',
    next: 'Play six hard snare hits, with two seconds between.',
  };
}
