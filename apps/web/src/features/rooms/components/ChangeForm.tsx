import { Box, Flex, Grid } from '@chakra-ui/react';
import {
  changeCategories,
  type CreateRoomChangeRequest,
  type ListRoomChangesResponse,
  type RoomChangeResponse,
  type RoomResponse,
  type UserSettings,
} from '@thudline/contracts';
import { useState, type FormEvent } from 'react';
import { Button, TextButton } from '../../../components/Button';
import { CheckBox } from '../../../components/CheckBox';
import { Dialog } from '../../../components/Dialog';
import { FieldError } from '../../../components/FieldError';
import { InlineSelect } from '../../../components/InlineSelect';
import { TextArea } from '../../../components/TextArea';
import { FieldLabel, TextField } from '../../../components/TextField';
import { changeDraftOf, offeredTakes, suggestedTakes, type ChangeDraft } from '../changeDraft';
import { categoryWords, dayWords } from '../roomWords';
import { NumberField, numberOf } from './NumberField';
import { PlaceOnPlan } from './PlaceOnPlan';

type RoomTake = ListRoomChangesResponse['takes'][number];
const feetInAMetre = 3.28084;

/** One entry of the log: what, when, and which takes show it. */
export function ChangeForm({
  room,
  change = null,
  takes,
  lengthUnit,
  onSave,
  onRemove,
  onClose,
}: {
  room: RoomResponse;
  change?: RoomChangeResponse | null;
  takes: readonly RoomTake[];
  lengthUnit: UserSettings['lengthUnit'];
  onSave: (request: CreateRoomChangeRequest) => Promise<void>;
  onRemove?: () => Promise<void>;
  onClose: () => void;
}) {
  const m = lengthUnit === 'metre' ? 1 : feetInAMetre;
  const [draft, setDraft] = useState(() => inUnits(changeDraftOf(change, new Date()), m));
  const [failure, setFailure] = useState('');
  const [busy, setBusy] = useState(false);
  const set = (part: Partial<ChangeDraft>) => setDraft((before) => ({ ...before, ...part }));
  const act = async (work: () => Promise<void>) => {
    setBusy(true);
    try {
      await work();
      onClose();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'That did not work. Try again.');
      setBusy(false);
    }
  };
  const save = (event: FormEvent) => {
    event.preventDefault();
    void act(() => onSave(requestOf(draft, m)));
  };
  return (
    <Dialog title={change ? `Change ${change.number}` : 'What did you change?'} onClose={onClose}>
      <form onSubmit={save}>
        <Flex direction="column" gap="16px" marginTop="14px">
          <TextField
            label="What you changed"
            value={draft.what}
            onChange={(what) => set({ what })}
            maxLength={120}
            required
          />
          <Grid templateColumns="repeat(2, 1fr)" gap="14px">
            <TextField
              label="Day"
              type="date"
              value={draft.happenedOn}
              onChange={(happenedOn) => set({ happenedOn, ...(change ? {} : { before: null, after: null }) })}
              required
            />
            <TextField
              label="Cost, if any"
              value={draft.cost}
              onChange={(cost) => set({ cost })}
              maxLength={40}
            />
          </Grid>
          <Box>
            It is{' '}
            <InlineSelect
              label="Kind of change"
              value={draft.category}
              options={changeCategories}
              words={(category) => categoryWords[category]}
              onChange={(category) => set({ category })}
            />
          </Box>
          <PlaceOnPlan
            room={room}
            place={requestOf(draft, m).place ?? null}
            onPlace={({ xM, yM }) => set(inUnits({ ...draft, placeX: String(xM), placeY: String(yM) }, m))}
          />
          <Grid templateColumns="repeat(2, 1fr)" gap="14px">
            <NumberField
              label={`On the plan, from the left, ${m === 1 ? 'm' : 'ft'}`}
              text={draft.placeX}
              onChange={(placeX) => set({ placeX })}
            />
            <NumberField
              label={`From the front, ${m === 1 ? 'm' : 'ft'}`}
              text={draft.placeY}
              onChange={(placeY) => set({ placeY })}
            />
          </Grid>
          <TextArea label="Note" value={draft.note} onChange={(note) => set({ note })} maxLength={2000} />
          <TakeSides takes={takes} draft={draft} set={set} />
        </Flex>
        {failure && <FieldError>{failure}</FieldError>}
        <Flex marginTop="20px" gap="18px" alignItems="center">
          <Button type="submit" disabled={busy}>
            Keep it in the log
          </Button>
          {onRemove && (
            <TextButton type="button" fontSize="small" disabled={busy} onClick={() => void act(onRemove)}>
              remove it
            </TextButton>
          )}
        </Flex>
      </form>
    </Dialog>
  );
}

function TakeSides({
  takes,
  draft,
  set,
}: {
  takes: readonly RoomTake[];
  draft: ChangeDraft;
  set: (part: Partial<ChangeDraft>) => void;
}) {
  const suggested = suggestedTakes(takes, draft.happenedOn);
  const offered = offeredTakes(takes, draft);
  const chosen = { before: draft.before ?? suggested.before, after: draft.after ?? suggested.after };
  const choose = (side: 'before' | 'after', id: string, on: boolean) =>
    set({ ...chosen, [side]: on ? [...chosen[side], id] : chosen[side].filter((each) => each !== id) });
  return (
    <Grid templateColumns={{ base: '1fr', md: 'repeat(2, 1fr)' }} gap="14px">
      {(['before', 'after'] as const).map((side) => (
        <Box as="fieldset" key={side} minWidth={0}>
          <FieldLabel as="legend">{side === 'before' ? 'Takes before it' : 'Takes after it'}</FieldLabel>
          {offered[side].length === 0 && (
            <Box fontSize="small" color="ink.muted" marginTop="6px">
              None yet.
            </Box>
          )}
          {offered[side].map(({ id, number, title, recordedAt }) => (
            <Box key={id} marginTop="6px" fontSize="small">
              <CheckBox
                checked={chosen[side].includes(id)}
                onChange={(on) => choose(side, id, on)}
              >{`take ${number}${title && `, ${title}`}, ${dayWords(recordedAt)}`}</CheckBox>
            </Box>
          ))}
        </Box>
      ))}
    </Grid>
  );
}

function inUnits(draft: ChangeDraft, m: number): ChangeDraft {
  const told = (text: string) => (text === '' ? '' : String(Number((Number(text) * m).toFixed(2))));
  return { ...draft, placeX: told(draft.placeX), placeY: told(draft.placeY) };
}

function requestOf(draft: ChangeDraft, m: number): CreateRoomChangeRequest {
  const [x, y] = [numberOf(draft.placeX), numberOf(draft.placeY)];
  return {
    what: draft.what,
    happenedOn: draft.happenedOn,
    category: draft.category,
    cost: draft.cost,
    note: draft.note,
    place: x === null || y === null ? null : { xM: x / m, yM: y / m },
    ...(draft.before ? { beforeTakeIds: draft.before } : {}),
    ...(draft.after ? { afterTakeIds: draft.after } : {}),
  };
}
