import { Box, chakra } from '@chakra-ui/react';
import type { ShareResponse } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { TextLink } from '../../../components/TextLink';
import { openedWords, rightsWords } from '../shareWords';
import { subjectPath, subjectWords } from '../subjectWords';

export const linkGrid = {
  display: { base: 'block', lg: 'grid' },
  gridTemplateColumns: 'minmax(0, 1.2fr) minmax(0, 1.6fr) minmax(0, 1.3fr) minmax(0, 1.3fr) 130px',
  columnGap: '24px',
} as const;

interface LinkRowProps {
  share: ShareResponse;
  now: Date;
  /** Ending it, or opening it again; nothing where only time ended it. */
  action: ReactNode;
}

/** One link: for whom, what it opens, when it was opened, what it allows and until when. */
export function LinkRow({ share, now, action }: LinkRowProps) {
  const { subject, about, label, mailedTo, question, revokedAt } = share;
  return (
    <Box
      as="li"
      {...linkGrid}
      listStyleType="none"
      borderBottom="1px solid"
      borderColor="rule"
      paddingY="13px"
      lineHeight="24px"
      overflowWrap="anywhere"
    >
      <chakra.div fontWeight={600}>{label || mailedTo || 'whoever has it'}</chakra.div>
      <div>
        <TextLink to={subjectPath(subject)}>{about}</TextLink>
        <Box fontSize="caption" color="ink.muted" lineHeight="19px">
          {[subjectWords[subject.kind].kind, question && `“${question}”`].filter(Boolean).join(' · ')}
        </Box>
      </div>
      <Box fontSize="small">{openedWords(share, now)}</Box>
      <Box fontSize="small" color="ink.muted">
        {revokedAt ? 'Ended.' : rightsWords(share)}
      </Box>
      <Box fontSize="small" textAlign={{ lg: 'right' }}>
        {action}
      </Box>
    </Box>
  );
}
