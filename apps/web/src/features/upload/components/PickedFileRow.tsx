import { Box, Flex } from '@chakra-ui/react';
import { FieldError } from '../../../components/FieldError';
import { ProgressSwell } from '../../../components/ProgressSwell';
import type { ChosenRole, Slot } from '../arrangement';
import type { PickedFile, ReadyFile } from '../pickedFile';
import type { FileProgress } from '../uploadProgress';
import {
  afterColon,
  factsWords,
  foreignFileWords,
  sentWords,
  shortTimeLeft,
  sizeWords,
} from '../uploadWords';
import { FileRow, Sentence, sentenceAreas } from './FileRow';
import { RoleChooser } from './RoleChooser';

/** A file that isn't sent, with what is wrong and what to do. */
export function FileNotSent({
  picked,
  strong,
  message,
  onClear,
}: {
  picked: PickedFile;
  strong: string;
  message: string;
  /** Absent while files are on their way. */
  onClear: (() => void) | null;
}) {
  const { file, reading } = picked;
  return (
    <FileRow
      name={file.name}
      facts={reading.kind === 'ready' ? factsWords(reading.facts) : foreignFileWords(file)}
      areas={sentenceAreas}
      action={onClear && { word: 'Clear', label: `Clear ${file.name}`, onAct: onClear }}
    >
      <Sentence marginTop="-9px">
        <FieldError>
          <b>{strong}</b> {afterColon(message)}
        </FieldError>
      </Sentence>
    </FileRow>
  );
}

/** A file whose header and low end are being read. */
export function FileBeingRead({ file }: { file: File }) {
  return (
    <FileRow name={file.name} facts={sizeWords(file.size)} action={null} areas={sentenceAreas}>
      <Sentence color="ink.muted" role="status">
        Looking at it…
      </Sentence>
    </FileRow>
  );
}

/** A file of the take: which microphone it is, and how much of it is there. */
export function TakeFileRow({
  picked,
  slots,
  stereo,
  progress,
  onChooseRole,
  onClear,
  onStop,
}: {
  picked: ReadyFile;
  slots: Slot[];
  /** One file with a microphone on each side. */
  stereo: boolean;
  /** Null: not being sent. */
  progress: FileProgress | null;
  onChooseRole: (chosen: ChosenRole) => void;
  onClear: () => void;
  onStop: () => void;
}) {
  const { name } = picked.file;
  const action = progress
    ? { word: 'Stop', label: `Stop sending ${name}`, onAct: onStop }
    : { word: 'Clear', label: `Clear ${name}`, onAct: onClear };
  return (
    <FileRow name={name} facts={factsWords(picked.reading.facts)} action={action}>
      <Box gridArea="role" display="grid" gap="10px" paddingTop={{ lg: '2px' }}>
        {slots.map((slot, index) => (
          <RoleChooser
            key={slot.key}
            slot={slot}
            of={name}
            side={stereo ? (index === 0 ? 'left' : 'right') : undefined}
            disabled={progress !== null}
            onChoose={(role) => onChooseRole({ slotKey: slot.key, role })}
          />
        ))}
        {remarks(picked, stereo).map((remark) => (
          <Box key={remark} fontSize="caption" lineHeight="18px" color="ink.muted">
            {remark}
          </Box>
        ))}
      </Box>
      <SentSoFar name={name} sizeBytes={picked.file.size} progress={progress} />
    </FileRow>
  );
}

/** What is worth knowing of a file before it is sent. */
function remarks({ reading }: ReadyFile, stereo: boolean): string[] {
  const { channels, cutShort } = reading.facts;
  return [usedPart(channels, stereo), cutShort ? 'Shorter than its header says.' : ''].filter(Boolean);
}

/** Says so where not everything in a file is measured. */
function usedPart(channels: number, stereo: boolean): string {
  if (stereo) return channels > 2 ? `Channels 1 and 2 of ${channels} are measured.` : '';
  if (channels === 2) return 'Its left side is measured.';
  return channels > 2 ? `Channel 1 of ${channels} is measured.` : '';
}

function SentSoFar({
  name,
  sizeBytes,
  progress,
}: {
  name: string;
  sizeBytes: number;
  progress: FileProgress | null;
}) {
  const sent = progress ? sentWords(progress.sentBytes, sizeBytes) : sizeWords(sizeBytes);
  return (
    <Box gridArea="sent" alignSelf={{ base: 'center', lg: 'start' }} paddingTop={{ base: 0, lg: '19px' }}>
      <ProgressSwell
        share={(progress?.sentBytes ?? 0) / sizeBytes}
        label={`Sent of ${name}`}
        valueText={sent}
      />
      <Flex justifyContent="space-between" marginTop="7px" fontSize="caption" lineHeight="18px">
        <Box color="ink.muted">{sent}</Box>
        <Box fontWeight={600}>{progress ? shortTimeLeft(progress.secondsLeft) : ''}</Box>
      </Flex>
    </Box>
  );
}
