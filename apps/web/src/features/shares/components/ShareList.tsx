import { Box, chakra } from '@chakra-ui/react';
import type { ShareSubject } from '@thudline/contracts';
import { TextButton } from '../../../components/Button';
import { plural } from '../../../lib/format';
import { useNow } from '../../takes/hooks/useNow';
import { useShares } from '../hooks/useShares';
import { isOpen, openedWords } from '../shareWords';
import { ShareRow } from './ShareRow';

/** The links to this sheet: whether and when they were opened, and the way to end them. */
export function ShareList({ subject }: { subject: ShareSubject }) {
  const { shares, error, retry } = useShares(subject);
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
        <chakra.ul listStyleType="none" aria-label="Links that open this sheet">
          {open.map((share) => (
            <ShareRow key={share.id} share={share} now={now} />
          ))}
        </chakra.ul>
      )}
      {ended.length > 0 && (
        <chakra.details marginTop="6px">
          <chakra.summary cursor="pointer" paddingY="4px">
            {plural(ended.length, 'link')} ended
          </chakra.summary>
          <chakra.ul listStyleType="none">
            {ended.map((share) => (
              <li key={share.id}>
                {share.question && `“${share.question}” `}
                {openedWords(share, now)}
              </li>
            ))}
          </chakra.ul>
        </chakra.details>
      )}
    </Box>
  );
}
