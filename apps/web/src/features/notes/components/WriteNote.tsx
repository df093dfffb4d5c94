import { Box } from '@chakra-ui/react';
import type { NotePin } from '@thudline/contracts';
import { useState, type ReactNode } from 'react';
import { InlineSelect } from '../../../components/InlineSelect';
import { aboutChoices, keyOf } from '../aboutChoices';
import { useGuestName } from '../hooks/useGuestName';
import { useListOf } from '../hooks/useListOf';
import { useNotesBench } from '../notesBench';
import { InlineText } from './InlineText';
import { NoteForm } from './NoteForm';

interface WriteNoteProps {
  start: NotePin;
  label?: string;
  send?: string;
  remark?: ReactNode;
  onLeave?: () => void;
  autoFocus?: boolean;
  wide?: boolean;
}

/** A new note: about what, from whom where nobody is signed in, and the words. */
export function WriteNote({ start, label = 'Your note', send = 'Send the note', ...props }: WriteNoteProps) {
  const { report, listening, chosenHit, list, actions } = useNotesBench();
  const guest = useGuestName();
  const [picked, setPicked] = useState<NotePin | null>(null);
  const { media } = listening;
  const [playedS, setPlayedS] = useState(media.currentTime);
  const pin = picked ?? start;
  const hitS = chosenHit === null ? null : report.hits[chosenHit].timeS;
  const choices = aboutChoices(report, { hitS, playedS, pin });
  const choiceOf = (key: string) => choices.find((choice) => choice.key === key);
  return (
    <NoteForm
      {...props}
      {...{ label, send }}
      listOf={useListOf()}
      about={
        <Box
          fontSize={props.wide ? 'body' : 'small'}
          lineHeight="30px"
          // The take may have played on since.
          onFocusCapture={() => setPlayedS(media.currentTime)}
        >
          About{' '}
          <InlineSelect
            label="What the note is about"
            value={keyOf(pin)}
            options={choices.map(({ key }) => key)}
            words={(key) => choiceOf(key)?.words ?? ''}
            onChange={(key) => setPicked(choiceOf(key)?.pin ?? null)}
          />
          {list.needsName && (
            <>
              , from{' '}
              <InlineText label="Your name" value={guest.name} onChange={guest.setName} maxLength={60} />
            </>
          )}
        </Box>
      }
      onSend={async (draft) => {
        await actions.write({ ...draft, pin, guestName: list.needsName ? guest.name : undefined });
        setPicked(null);
        props.onLeave?.();
      }}
    />
  );
}
