import { Box } from '@chakra-ui/react';
import type { TryOutResponse } from '@thudline/contracts';
import { Headline } from '../../../components/Headline';
import type { HeadlineWords } from '../headline';
import { takesWords } from '../rows';
import { subjectWords } from '../subjectWords';

const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short' });

/** "Try-out · how high the overhead hangs · takes 16 to 20 · 4 Dec", and the line. */
export function TryOutHead({ tryOut, words }: { tryOut: TryOutResponse; words: HeadlineWords }) {
  const parts = [
    'Try-out',
    subjectWords(tryOut).differs,
    takesWords(tryOut),
    day.format(new Date(tryOut.createdAt)),
  ];
  return (
    <>
      <Box fontSize="small" color="ink.muted" lineHeight="22px">
        {parts.join(' · ')}
      </Box>
      <Headline marginTop="8px">
        <b>{words.strong}</b> {words.rest}
      </Headline>
    </>
  );
}
