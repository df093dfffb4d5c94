import { Box, Flex, chakra } from '@chakra-ui/react';
import {
  paths,
  type ListRoomChangesResponse,
  type RoomChangeResponse,
  type RoomResponse,
  type UserSettings,
} from '@thudline/contracts';
import { useState, type ReactNode } from 'react';
import { Button } from '../../../components/Button';
import { Headline } from '../../../components/Headline';
import { SheetPaper } from '../../../components/SheetPaper';
import { headSentence } from '../headSentence';
import { useRoomActions } from '../hooks/useRoomActions';
import { ordersOfDay } from '../ordersOfDay';
import { logWords } from '../roomWords';
import { ChangeEntry } from './ChangeEntry';
import { ChangeForm } from './ChangeForm';
import { RoomForm } from './RoomForm';
import { RoomMargin } from './RoomMargin';
import { Trend } from './Trend';

type Open = { form: 'room' } | { form: 'change'; change: RoomChangeResponse | null } | null;

/** A room's log: what the newest changes did, its figures over time, and every change. */
export function RoomLog({
  room,
  changes,
  takes,
  settings,
  readOnly,
  above,
  marginHead,
  canHear = true,
}: {
  room: RoomResponse;
  changes: RoomChangeResponse[];
  takes: ListRoomChangesResponse['takes'];
  settings: UserSettings;
  readOnly: boolean;
  /** Stands above the line: what a guest is asked. */
  above?: ReactNode;
  /** At the head of the margin: sending the log. */
  marginHead?: ReactNode;
  /** Hearing a change reads the sheets of both takes. */
  canHear?: boolean;
}) {
  const [open, setOpen] = useState<Open>(null);
  const edit = readOnly ? undefined : () => setOpen({ form: 'room' });
  const { putInOrder } = useRoomActions();
  const moves = (change: RoomChangeResponse) => {
    const { earlier, later } = ordersOfDay(changes, change);
    return {
      onEarlier: earlier && (() => void putInOrder(room.id, earlier)),
      onLater: later && (() => void putInOrder(room.id, later)),
    };
  };
  return (
    <SheetPaper
      margin={
        <>
          {marginHead}
          <RoomMargin room={room} changes={changes} lengthUnit={settings.lengthUnit} onEdit={edit} />
        </>
      }
    >
      {above}
      <Box color="ink.muted" fontSize="small" lineHeight="22px">
        {logWords(room)}
      </Box>
      <Headline marginTop="4px">
        {headSentence(changes).map(({ strong, rest }) => (
          <span key={strong}>
            <b>{strong}</b> {rest}{' '}
          </span>
        ))}
      </Headline>
      <Flex gap="14px" marginTop="16px" wrap="wrap" _print={{ display: 'none' }}>
        {!readOnly && (
          <Button onClick={() => setOpen({ form: 'change', change: null })}>I changed something</Button>
        )}
        <Button look="outline" onClick={() => window.print()}>
          Print this room
        </Button>
      </Flex>
      <Trend path={paths.roomTrend(room.id)} changes={changes} />
      {changes.length > 0 && (
        <>
          <chakra.h2
            fontSize="section"
            fontWeight={900}
            lineHeight="30px"
            marginTop="30px"
            marginBottom="12px"
          >
            What changed, newest first
          </chakra.h2>
          <chakra.ol listStyleType="none">
            {changes.map((change) => (
              <ChangeEntry
                key={change.id}
                roomId={room.id}
                change={change}
                canHear={canHear}
                actions={
                  readOnly
                    ? undefined
                    : { onEdit: () => setOpen({ form: 'change', change }), ...moves(change) }
                }
              />
            ))}
          </chakra.ol>
        </>
      )}
      <OpenForm {...{ open, room, takes, settings }} onClose={() => setOpen(null)} />
    </SheetPaper>
  );
}

function OpenForm({
  open,
  room,
  takes,
  settings,
  onClose,
}: {
  open: Open;
  room: RoomResponse;
  takes: ListRoomChangesResponse['takes'];
  settings: UserSettings;
  onClose: () => void;
}) {
  const actions = useRoomActions();
  if (!open) return null;
  if (open.form === 'room')
    return (
      <RoomForm
        title={room.name}
        room={room}
        settings={settings}
        onSave={async (request) => {
          await actions.update(room.id, request);
          onClose();
        }}
        onClose={onClose}
      />
    );
  const { change } = open;
  return (
    <ChangeForm
      {...{ room, change, takes, onClose }}
      lengthUnit={settings.lengthUnit}
      onSave={(request) =>
        change ? actions.updateChange(room.id, change.id, request) : actions.addChange(room.id, request)
      }
      onRemove={change ? () => actions.removeChange(room.id, change.id) : undefined}
    />
  );
}
