import { Box } from '@chakra-ui/react';
import { tryOutLimits, type TryOutResponse } from '@thudline/contracts';
import { InlineSelect } from '../../../components/InlineSelect';
import { TextLink } from '../../../components/TextLink';
import { useTakesFitting } from '../../takes/hooks/useTakes';
import { takeName } from '../../takes/rowWords';
import { everyTake } from '../../takes/takesQuery';
import { useTryOutActions } from '../hooks/useTryOutActions';

const none = '';
/** Far enough back for an evening's takes. */
const offered = 50;

/** One more take of this try-out: one that is there, or recordings that are still to be sent. */
export function AddTake({
  tryOut,
  keep,
}: {
  tryOut: TryOutResponse;
  keep: (act: () => Promise<unknown>) => Promise<void>;
}) {
  const { addPlaces } = useTryOutActions();
  const { page } = useTakesFitting(everyTake, offered);
  if (tryOut.places.length >= tryOutLimits.mostTakes)
    return <Box>A try-out has at most {tryOutLimits.mostTakes} takes.</Box>;
  const there = tryOut.places.map(({ take }) => take?.id);
  const others = (page?.items ?? []).filter(({ id }) => !there.includes(id));
  const nameOf = (id: string) => {
    const take = others.find((other) => other.id === id);
    return take ? takeName(take) : 'a take that is there';
  };
  return (
    <Box lineHeight="36px">
      Add{' '}
      {others.length > 0 && (
        <>
          <InlineSelect
            label="Add a take that is there"
            value={none}
            options={[none, ...others.map(({ id }) => id)]}
            words={nameOf}
            onChange={(takeId) => takeId && void keep(() => addPlaces(tryOut.id, { places: [{ takeId }] }))}
          />
          {', or '}
        </>
      )}
      <TextLink to={`/tryouts/new?to=${tryOut.id}`}>new recordings</TextLink>
    </Box>
  );
}
