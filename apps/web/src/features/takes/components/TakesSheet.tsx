import { Box, chakra } from '@chakra-ui/react';
import { defaultUserSettings, type TakeListItem } from '@thudline/contracts';
import { useRef, useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { TextLink } from '../../../components/TextLink';
import { useMe } from '../../auth/hooks/useMe';
import { useTakeActions } from '../hooks/useTakeActions';
import { useTakes } from '../hooks/useTakes';
import { pagePlace } from '../paging';
import { takeName } from '../rowWords';
import { TakesEmpty } from './TakesEmpty';
import { TakesError } from './TakesError';
import { TakesFoot } from './TakesFoot';
import { TakesHeading } from './TakesHeading';
import { TakesLoading } from './TakesLoading';
import { TakesTable } from './TakesTable';

/** All the player's takes, a page at a time. */
export function TakesSheet() {
  const { me } = useMe();
  const target = (me?.settings ?? defaultUserSettings).target;
  const place = pagePlace(useSearchParams()[0]);
  const { page, error, retry } = useTakes(place.cursor);
  const { said, heading, deleteTake } = useDeleteTake(page?.items.length === 1 && place.cursor !== null);

  if (page && page.total === 0) return <TakesEmpty />;
  return (
    <Box marginX={{ base: 0, lg: '-24px' }} marginTop={{ base: 0, lg: '-3px' }}>
      <TakesHeading headingRef={heading} />
      <chakra.span role="status" srOnly>
        {said}
      </chakra.span>
      {!page && error && <TakesError message={error.message} onRetry={retry} />}
      {!page && !error && <TakesLoading target={target} />}
      {page && page.items.length === 0 && <NothingOlder />}
      {page && page.items.length > 0 && (
        <>
          <TakesTable takes={page.items} target={target} onDelete={deleteTake} />
          <TakesFoot
            place={place}
            shownRows={page.items.length}
            total={page.total}
            nextCursor={page.nextCursor}
          />
        </>
      )}
    </Box>
  );
}

function NothingOlder() {
  return (
    <chakra.p marginTop="24px" paddingTop="16px" borderTop="1px solid" borderColor="rule">
      There is nothing older than this. <TextLink to="/takes">Go to the newest takes</TextLink>
    </chakra.p>
  );
}

/** After a take is gone the focus rests on the heading, and a page that lost its last row gives way to the newest. */
function useDeleteTake(lastOfPage: boolean) {
  const { remove } = useTakeActions();
  const navigate = useNavigate();
  const heading = useRef<HTMLHeadingElement>(null);
  const [said, setSaid] = useState('');
  const deleteTake = async (take: TakeListItem) => {
    await remove(take.id);
    setSaid(`${takeName(take)} is deleted.`);
    heading.current?.focus();
    if (lastOfPage) await navigate('/takes', { replace: true });
  };
  return { said, heading, deleteTake };
}
