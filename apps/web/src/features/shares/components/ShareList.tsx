import { Box, chakra } from '@chakra-ui/react';
import type { ShareResponse, ShareSubject } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { plural } from '../../../lib/format';
import { useNow } from '../../takes/hooks/useNow';
import { useEnding, type Ending } from '../hooks/useEnding';
import { useShares } from '../hooks/useShares';
import { isOpen, openedWords } from '../shareWords';
import { subjectWords } from '../subjectWords';
import { ShareRow } from './ShareRow';

/** The links to one subject: who has them, whether and when they were opened, and the way to end them. */
export function ShareList({ subject }: { subject: ShareSubject }) {
  const { shares, error, retry } = useShares(subject);
  const ending = useEnding();
  const now = useNow();
  if (error)
    return (
      <Box role="alert" fontSize="caption" marginTop="8px">
        The links could not be loaded. {error.message} <TextButton onClick={retry}>Try again</TextButton>
      </Box>
    );
  if (!shares) return <Box height="26px" role="status" aria-label="Loading the links" />;
  const open = shares.filter((share) => isOpen(share, now));
  const ended = shares.filter((share) => !isOpen(share, now));
  return (
    <Box fontSize="caption" lineHeight="19px" color="ink.muted" marginTop="8px">
      {shares.length === 0 && 'Nobody has it yet. A link lets them read and listen.'}
      {open.length > 0 && (
        <chakra.ul
          listStyleType="none"
          aria-label={`Links that open this ${subjectWords[subject.kind].thing}`}
        >
          {open.map((share) => (
            <ShareRow key={share.id} share={share} now={now} onEnd={() => ending.end(share.id)} />
          ))}
        </chakra.ul>
      )}
      <JustEnded ending={ending} />
      {ended.length > 0 && <EndedLinks {...{ ended, now, ending }} />}
    </Box>
  );
}

/** What was just done, and the way back. */
function JustEnded({ ending }: { ending: Ending }) {
  const { endedId, failure, restore } = ending;
  return (
    <Box role="status" marginTop={endedId || failure ? '8px' : 0} color={failure ? 'fix' : 'ink'}>
      {failure}
      {!failure && endedId && (
        <>
          The link is ended: whoever has it can’t open it any more.{' '}
          <TextButton fontWeight={600} onClick={() => restore(endedId)}>
            Undo
          </TextButton>
        </>
      )}
    </Box>
  );
}

function EndedLinks({ ended, now, ending }: { ended: ShareResponse[]; now: Date; ending: Ending }) {
  return (
    <chakra.details marginTop="6px">
      <chakra.summary cursor="pointer" paddingY="4px">
        {plural(ended.length, 'link')} ended
      </chakra.summary>
      <chakra.ul listStyleType="none">
        {ended.map((share) => (
          <chakra.li key={share.id} marginTop="6px" overflowWrap="anywhere">
            {[share.label && `${share.label}.`, share.question && `“${share.question}”`]
              .filter(Boolean)
              .join(' ')}{' '}
            {openedWords(share, now)}{' '}
            {isOpen({ ...share, revokedAt: null }, now) && (
              <TextButton onClick={() => ending.restore(share.id)}>Open it again</TextButton>
            )}
          </chakra.li>
        ))}
      </chakra.ul>
    </chakra.details>
  );
}
