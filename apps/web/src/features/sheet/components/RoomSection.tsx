import { Box } from '@chakra-ui/react';
import type { ReportResponse, Room } from '@thudline/contracts';
import { number } from '../../../lib/format';
import { bandName } from './bandName';
import { Findings } from './Findings';
import { MarginNote } from './RuledSheet';
import { findingsOf, roomTopics, roomWord, worstStatus } from './sectionWords';
import { SheetSection } from './SheetSection';

/** Room: how a loud snare dies away. Not there for a take measured before it was. */
export function RoomSection({ report }: { report: ReportResponse }) {
  const { room } = report;
  if (!room) return null;
  const findings = findingsOf(report, roomTopics);
  const bands = bandTexts(room);
  return (
    <SheetSection
      id="room"
      title="Room"
      word={roomWord(room)}
      status={worstStatus(findings)}
      note={
        room.decayS !== null && (
          <MarginNote from="Thudline" about="the room">
            From {room.snareHits} loud snare hits, 500 Hz and 1 kHz. For comparing takes of one snare in one
            room; no standard room measurement.
          </MarginNote>
        )
      }
    >
      <Findings findings={findings} />
      {bands.length > 0 && (
        <Box
          color="ink.muted"
          fontSize="small"
          lineHeight="22px"
          marginTop="8px"
          _print={room.decayS === null ? { display: 'none' } : undefined}
        >
          Seconds per 60 dB: {bands.join(', ')}. Below 500 Hz not judged: the drum rings longer than the room.
        </Box>
      )}
    </SheetSection>
  );
}

const bandTexts = ({ bands }: Room): string[] =>
  bands.flatMap(({ centreHz, t20S }) => (t20S ? [`${bandName(centreHz)} ${number(t20S.median, 2)}`] : []));
