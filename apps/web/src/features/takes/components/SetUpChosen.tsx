import { chakra } from '@chakra-ui/react';
import type { NamedSetup } from '@thudline/contracts';
import { useSetups } from '../../setups/hooks/useSetups';

const unchosen = '';

/** Says what the chosen takes were recorded with; not offered before there is a setup. */
export function SetUpChosen({ onChoose }: { onChoose: (setup: NamedSetup) => void }) {
  const { setups } = useSetups();
  if (!setups || setups.length === 0) return null;
  return (
    <chakra.select
      aria-label="Recorded with"
      value={unchosen}
      onChange={(event) => {
        const setup = setups.find(({ id }) => id === event.target.value);
        if (setup) onChoose(setup);
      }}
      minHeight="44px"
      maxWidth="200px"
      paddingX="14px"
      bg="sheet"
      color="ink"
      fontWeight={600}
      border="2px solid"
      borderColor="ink"
      borderRadius="3px"
      cursor="pointer"
    >
      <option value={unchosen}>Recorded with…</option>
      {setups.map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </chakra.select>
  );
}
