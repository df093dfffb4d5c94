import { Box, Flex, chakra } from '@chakra-ui/react';
import { TextButton } from '../../../components/Button';
import type { NewTake } from '../hooks/useNewTake';
import { isReady, type PickedFile } from '../pickedFile';
import { fileProgress } from '../uploadProgress';
import { limitWords, rateWords } from '../uploadWords';
import type { ChooseFiles } from './DropAnywhere';
import { SentBefore } from './SentBefore';
import { FileBeingRead, FileNotSent, TakeFileRow } from './PickedFileRow';

/** Every picked file in its row, and the way to more. */
export function FileRows({ newTake, choose }: { newTake: NewTake; choose: ChooseFiles }) {
  const sending = newTake.state.sending.phase === 'sending';
  return (
    <>
      <chakra.ul
        aria-label="Files"
        borderTop="1px solid"
        borderColor="rule"
        marginTop="14px"
        listStyleType="none"
      >
        {newTake.state.files.map((picked) => (
          <Row key={picked.id} picked={picked} newTake={newTake} />
        ))}
      </chakra.ul>
      <SentBefore files={newTake.arranged.used} />
      <Flex
        justifyContent="space-between"
        columnGap="24px"
        rowGap="8px"
        wrap="wrap"
        marginTop="10px"
        fontSize="caption"
        lineHeight="20px"
        color="ink.muted"
      >
        <Box>
          Drop more WAV files anywhere on this page, or{' '}
          <TextButton type="button" color="ink" onClick={() => choose()}>
            choose files
          </TextButton>
          . Up to {limitWords} each, kept bit for bit, seen by nobody until you send it.
        </Box>
        {!sending && newTake.arranged.kind !== 'stereo' && (
          <TextButton type="button" onClick={() => choose('replaced')}>
            one stereo file instead
          </TextButton>
        )}
      </Flex>
    </>
  );
}

function Row({ picked, newTake }: { picked: PickedFile; newTake: NewTake }) {
  const { arranged, state } = newTake;
  const sending = state.sending.phase === 'sending' ? state.sending : null;
  const index = arranged.used.findIndex(({ id }) => id === picked.id);
  const clear = () => newTake.remove(picked.id);
  const notSent = { picked, onClear: sending && index >= 0 ? null : clear };

  if (picked.reading.kind === 'reading') return <FileBeingRead file={picked.file} />;
  if (picked.reading.kind === 'refused') {
    return <FileNotSent {...notSent} strong="Not sent:" message={picked.reading.message} />;
  }
  if (index === -1 || !isReady(picked)) {
    return (
      <FileNotSent
        {...notSent}
        strong="Left aside:"
        message="A take has two files. Clear one of them to use this one."
      />
    );
  }
  if (arranged.ratesDiffer && index === 1) {
    return <FileNotSent {...notSent} strong="Not together:" message={rateSentence(newTake)} />;
  }
  const sizesBytes = arranged.used.map(({ file }) => file.size);
  return (
    <TakeFileRow
      picked={picked}
      slots={arranged.slots.filter((slot) => slot.fileId === picked.id)}
      stereo={arranged.kind === 'stereo'}
      progress={sending && fileProgress(sizesBytes, sending.progress)[index]}
      onChooseRole={newTake.chooseRole}
      onClear={clear}
      onStop={newTake.stop}
    />
  );
}

function rateSentence({ arranged }: NewTake): string {
  const [first, second] = arranged.used;
  const [firstRate, secondRate] = [first, second].map(({ reading }) => rateWords(reading.facts.sampleRateHz));
  return `This file has ${secondRate} and ${first.file.name} has ${firstRate}. Both must come from one session: export one of them again.`;
}
