import { Box, Flex, Grid } from '@chakra-ui/react';
import type { CreateRoomRequest, RoomResponse, UserSettings } from '@thudline/contracts';
import { useState, type FormEvent } from 'react';
import { Button } from '../../../components/Button';
import { CheckBox } from '../../../components/CheckBox';
import { Dialog } from '../../../components/Dialog';
import { FieldError } from '../../../components/FieldError';
import { TextField } from '../../../components/TextField';
import { draftOf, roomRequest, type RoomDraft, type RoomPartProps } from '../roomDraft';
import { KitFields } from './KitFields';
import { NumberField } from './NumberField';
import { SurfaceFields } from './SurfaceFields';

/** A room's name and whatever else is known of it. */
export function RoomForm({
  title,
  room = null,
  settings,
  onSave,
  onClose,
}: {
  title: string;
  room?: RoomResponse | null;
  settings: UserSettings;
  onSave: (request: Required<CreateRoomRequest>) => Promise<void>;
  onClose: () => void;
}) {
  const [draft, setDraft] = useState(() => draftOf(room, settings));
  const [failure, setFailure] = useState('');
  const [busy, setBusy] = useState(false);
  const set = (change: Partial<RoomDraft>) => setDraft((before) => ({ ...before, ...change }));
  const save = async (event: FormEvent) => {
    event.preventDefault();
    const request = roomRequest(draft, settings);
    if (!request) return setFailure('One of the numbers can’t be read.');
    setBusy(true);
    try {
      await onSave(request);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'That did not work. Try again.');
      setBusy(false);
    }
  };
  return (
    <Dialog title={title} onClose={onClose}>
      <form onSubmit={(event) => void save(event)}>
        <Flex direction="column" gap="16px" marginTop="14px">
          <TextField
            label="Name"
            value={draft.name}
            onChange={(name) => set({ name })}
            maxLength={60}
            required
          />
          <Measures draft={draft} settings={settings} set={set} />
          <SurfaceFields draft={draft} settings={settings} set={set} />
          <KitFields draft={draft} settings={settings} set={set} />
        </Flex>
        {failure && <FieldError id="room-failure">{failure}</FieldError>}
        <Button type="submit" marginTop="20px" disabled={busy}>
          Keep this room
        </Button>
      </form>
    </Dialog>
  );
}

function Measures({ draft, settings, set }: RoomPartProps) {
  const unit = settings.lengthUnit === 'metre' ? 'm' : 'ft';
  const degrees = settings.temperatureUnit === 'celsius' ? '°C' : '°F';
  return (
    <>
      {draft.isBox ? (
        <Grid templateColumns="repeat(3, 1fr)" gap="14px">
          <NumberField label={`Length, ${unit}`} text={draft.length} onChange={(length) => set({ length })} />
          <NumberField label={`Width, ${unit}`} text={draft.width} onChange={(width) => set({ width })} />
          <NumberField label={`Height, ${unit}`} text={draft.height} onChange={(height) => set({ height })} />
        </Grid>
      ) : (
        <Grid templateColumns="repeat(2, 1fr)" gap="14px">
          <NumberField
            label={`Volume, ${unit}³`}
            text={draft.volume}
            onChange={(volume) => set({ volume })}
          />
          <NumberField
            label={`Surface, ${unit}²`}
            text={draft.surface}
            onChange={(surface) => set({ surface })}
          />
        </Grid>
      )}
      <Box>
        <CheckBox checked={!draft.isBox} onChange={(notBox) => set({ isBox: !notBox })}>
          It is not a box
        </CheckBox>
      </Box>
      <NumberField
        label={`Temperature while you play, ${degrees}`}
        text={draft.temperature}
        onChange={(temperature) => set({ temperature })}
      />
    </>
  );
}
