import { Box, chakra } from '@chakra-ui/react';
import type { ShareResponse } from '@thudline/contracts';
import { Button, TextButton } from '../../../components/Button';
import { ButtonLink } from '../../../components/ButtonLink';
import { Headline } from '../../../components/Headline';
import { PageLoading } from '../../../components/PageLoading';
import { PageMessage } from '../../../components/PageMessage';
import { SheetPaper } from '../../../components/SheetPaper';
import { UndoBar } from '../../takes/components/UndoBar';
import { useNow } from '../../takes/hooks/useNow';
import { useEnding, type Ending } from '../hooks/useEnding';
import { useShares } from '../hooks/useShares';
import { linksHeadline } from '../linksHeadline';
import { isOpen } from '../shareWords';
import { LinkRow } from './LinkRow';

/** Every link of the player's, open ones first. */
export function LinksSheet({ readOnly }: { readOnly: boolean }) {
  const { shares, error, retry } = useShares();
  const ending = useEnding();
  const now = useNow();
  if (error)
    return (
      <PageMessage strong="The links could not be loaded." rest={error.message}>
        <Button onClick={retry}>Try again</Button>
      </PageMessage>
    );
  if (!shares) return <PageLoading />;
  if (shares.length === 0) return <NoLinks />;
  const { strong, rest } = linksHeadline(shares, now);
  const open = shares.filter((share) => isOpen(share, now));
  const ended = shares.filter((share) => !isOpen(share, now));
  return (
    <SheetPaper>
      <Headline marginTop={{ base: '8px', lg: '17px' }}>
        <b>{strong}</b> {rest}
      </Headline>
      {open.length > 0 && <Links title="Open" shares={open} {...{ now, ending, readOnly }} />}
      {ended.length > 0 && <Links title="Ended" shares={ended} {...{ now, ending, readOnly }} />}
      <UndoEnding ending={ending} />
    </SheetPaper>
  );
}

interface LinksProps {
  title: string;
  shares: ShareResponse[];
  now: Date;
  ending: Ending;
  readOnly: boolean;
}

function Links({ title, shares, now, ending, readOnly }: LinksProps) {
  return (
    <Box as="section" marginTop="28px" aria-label={title}>
      <chakra.h2 fontSize="section" fontWeight={900} lineHeight="30px">
        {title}
      </chakra.h2>
      <chakra.ul borderTop="2px solid" borderColor="ink" marginTop="6px">
        {shares.map((share) => (
          <LinkRow
            key={share.id}
            share={share}
            now={now}
            action={!readOnly && <LinkAction share={share} now={now} ending={ending} />}
          />
        ))}
      </chakra.ul>
    </Box>
  );
}

/** A link whose time is over can't be opened again; another one is made. */
function LinkAction({ share, now, ending }: { share: ShareResponse; now: Date; ending: Ending }) {
  const name = share.label || share.mailedTo || share.about;
  if (isOpen(share, now))
    return (
      <TextButton paddingY="8px" aria-label={`End the link for ${name}`} onClick={() => ending.end(share.id)}>
        End this link
      </TextButton>
    );
  if (!isOpen({ ...share, revokedAt: null }, now)) return 'Its time is over.';
  return (
    <TextButton
      paddingY="8px"
      aria-label={`Open the link for ${name} again`}
      onClick={() => ending.restore(share.id)}
    >
      Open it again
    </TextButton>
  );
}

function UndoEnding({ ending: { endedId, failure, restore, dismiss } }: { ending: Ending }) {
  if (!endedId && !failure) return null;
  return (
    <UndoBar
      words="The link is ended: whoever has it can’t open it any more."
      takesFocus
      failure={failure}
      onUndo={endedId ? () => restore(endedId) : undefined}
      onDismiss={dismiss}
    />
  );
}

function NoLinks() {
  return (
    <PageMessage
      strong="You have sent nothing yet."
      rest="A link lets somebody read a sheet, a comparison, a try-out or a room’s log without an account. Look for “Send this” in the margin."
    >
      <ButtonLink to="/takes">Go to your takes</ButtonLink>
    </PageMessage>
  );
}
