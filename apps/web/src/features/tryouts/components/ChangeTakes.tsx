import { Box, Flex, chakra } from '@chakra-ui/react';
import type { TryOutResponse } from '@thudline/contracts';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { useKeeping } from '../../../lib/useKeeping';
import { UndoBar } from '../../takes/components/UndoBar';
import { useUndo } from '../../takes/hooks/useUndo';
import { useTryOutActions } from '../hooks/useTryOutActions';
import type { LengthUnit } from '../positionWords';
import { AddTake } from './AddTake';
import { PlaceEdit } from './PlaceEdit';

interface ChangeTakesProps {
  tryOut: TryOutResponse;
  lengthUnit: LengthUnit;
}

/** Where each take stood, which belong to the try-out, and its end; closed until somebody wants to change something. */
export function ChangeTakes({ tryOut, lengthUnit }: ChangeTakesProps) {
  const [open, setOpen] = useState(false);
  const { update, updatePlace, removePlace, restorePlace } = useTryOutActions();
  const { failure, keep } = useKeeping();
  const { undo, ...bar } = useUndo();
  const takeOut = (placeId: string, name: string) =>
    keep(async () => {
      await removePlace(tryOut.id, placeId);
      bar.tell({
        words: `${name} is out of this try-out; the take itself stays.`,
        takesFocus: true,
        takeBack: {
          act: async () => void (await restorePlace(tryOut.id, placeId)),
          words: `${name} is back.`,
        },
      });
    });
  return (
    <Box marginTop="26px" _print={{ display: 'none' }}>
      <TextButton type="button" minHeight="44px" aria-expanded={open} onClick={() => setOpen(!open)}>
        {open ? 'done changing its takes' : 'change its takes'}
      </TextButton>
      {open && (
        <>
          <chakra.ol
            aria-label="Its takes"
            listStyleType="none"
            marginTop="6px"
            borderTop="1px solid"
            borderColor="rule"
          >
            {tryOut.places.map((place, index) => (
              <PlaceEdit
                key={place.id}
                {...{ tryOut, place, lengthUnit }}
                number={index + 1}
                onMove={(to) => void keep(() => updatePlace(tryOut.id, place.id, to))}
                onStandsHere={() => void keep(() => update(tryOut.id, { currentPlaceId: place.id }))}
                onTakeOut={(name) => void takeOut(place.id, name)}
              />
            ))}
          </chakra.ol>
          {failure && <FieldError>{failure}</FieldError>}
          <Flex wrap="wrap" alignItems="center" columnGap="24px" rowGap="4px" marginTop="12px">
            <AddTake tryOut={tryOut} keep={keep} />
            <DeleteTryOut tryOut={tryOut} keep={keep} />
          </Flex>
        </>
      )}
      {bar.words !== null && <UndoBar {...bar} words={bar.words} onUndo={undo} onDismiss={bar.dismiss} />}
    </Box>
  );
}

/** It is gone at once; the list of try-outs offers the way back. */
function DeleteTryOut({
  tryOut,
  keep,
}: {
  tryOut: TryOutResponse;
  keep: (act: () => Promise<unknown>) => Promise<void>;
}) {
  const { remove } = useTryOutActions();
  const navigate = useNavigate();
  const end = async () => {
    await remove(tryOut.id);
    await navigate('/tryouts', { state: { deletedId: tryOut.id } });
  };
  return (
    <TextButton type="button" minHeight="44px" color="fix" onClick={() => void keep(end)}>
      Delete this try-out
    </TextButton>
  );
}
