import { Box } from '@chakra-ui/react';
import type { RoomResponse, UserSettings } from '@thudline/contracts';
import { useState } from 'react';
import { Button } from '../../../components/Button';
import { Headline } from '../../../components/Headline';
import { SheetPaper } from '../../../components/SheetPaper';
import { RoomForm } from '../../rooms/components/RoomForm';
import { useRoomActions } from '../../rooms/hooks/useRoomActions';
import { missingWords } from '../calculatorWords';
import type { MissingMeasure } from '../knownRoom';

/** Asks for what the estimate can't do without. */
export function MissingMeasures({
  room,
  missing,
  settings,
  readOnly,
}: {
  room: RoomResponse;
  missing: readonly MissingMeasure[];
  settings: UserSettings;
  readOnly: boolean;
}) {
  const [open, setOpen] = useState(false);
  const { update } = useRoomActions();
  return (
    <SheetPaper>
      <Box color="ink.muted" fontSize="small" lineHeight="22px">
        {room.name} · an estimate before you spend anything
      </Box>
      <Headline marginTop="4px" maxWidth="704px">
        <b>Measure {missingWords(missing)} first.</b> A tape and two minutes do: then this says where the low
        notes gather and what wool, curtains or a carpet would change.
      </Headline>
      {!readOnly && (
        <Button marginTop="22px" onClick={() => setOpen(true)}>
          Write it down
        </Button>
      )}
      {open && (
        <RoomForm
          title={room.name}
          room={room}
          settings={settings}
          onSave={async (request) => {
            await update(room.id, request);
            setOpen(false);
          }}
          onClose={() => setOpen(false)}
        />
      )}
    </SheetPaper>
  );
}
