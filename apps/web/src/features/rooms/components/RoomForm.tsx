import { Box, Flex, Grid, chakra } from '@chakra-ui/react';
import type { CreateRoomRequest, RoomResponse, UserSettings } from '@thudline/contracts';
import { absorptionTable } from '@thudline/dsp';
import { useState, type FormEvent } from 'react';
import { Button } from '../../../components/Button';
import { CheckBox } from '../../../components/CheckBox';
import { Dialog } from '../../../components/Dialog';
import { FieldError } from '../../../components/FieldError';
import { FieldLabel, TextField } from '../../../components/TextField';
import { draftOf, roomRequest, surfacePlaces, type RoomDraft } from '../roomDraft';
import { NumberField } from './NumberField';

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
    const request = roomRequest(draft, settings, room?.surfaces);
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
          <Materials draft={draft} set={set} />
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

interface PartProps {
  draft: RoomDraft;
  settings: UserSettings;
  set: (change: Partial<RoomDraft>) => void;
}

function Measures({ draft, settings, set }: PartProps) {
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

function Materials({ draft, set }: Omit<PartProps, 'settings'>) {
  return (
    <Grid templateColumns={{ base: '1fr', md: 'repeat(2, 1fr)' }} gap="14px">
      {surfacePlaces.map((place) => (
        <FieldLabel key={place} as="label" css={{ '&': { display: 'block' } }}>
          {`${place.charAt(0).toUpperCase()}${place.slice(1)}`}
          <chakra.select
            value={draft.materials[place]}
            onChange={(event) => set({ materials: { ...draft.materials, [place]: event.target.value } })}
            display="block"
            width="100%"
            minHeight="44px"
            bg="transparent"
            color="ink"
            fontSize="body"
            borderBottom="2px solid"
            borderColor="edge"
            css={{ '& option': { background: 'sheet', color: 'ink' } }}
          >
            <option value="">not said</option>
            {absorptionTable.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </chakra.select>
        </FieldLabel>
      ))}
    </Grid>
  );
}

function KitFields({ draft, settings, set }: PartProps) {
  const unit = settings.lengthUnit === 'metre' ? 'm' : 'ft';
  return (
    <Box>
      <Box fontSize="small" color="ink.muted">
        Where you sit, on the plan: the length runs from left to right.
      </Box>
      <Grid templateColumns="repeat(3, 1fr)" gap="14px" marginTop="8px">
        <NumberField label={`From the left, ${unit}`} text={draft.kitX} onChange={(kitX) => set({ kitX })} />
        <NumberField label={`From the front, ${unit}`} text={draft.kitY} onChange={(kitY) => set({ kitY })} />
        <NumberField label="Turned, °" text={draft.kitTurned} onChange={(kitTurned) => set({ kitTurned })} />
      </Grid>
    </Box>
  );
}
