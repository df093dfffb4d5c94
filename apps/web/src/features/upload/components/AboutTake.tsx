import { Box, chakra } from '@chakra-ui/react';
import { SelectField } from '../../../components/SelectField';
import { TextArea } from '../../../components/TextArea';
import { TextField } from '../../../components/TextField';
import type { NewTake } from '../hooks/useNewTake';

/** What the take is called; it may still be written while the files travel. */
export function AboutTake({ newTake }: { newTake: NewTake }) {
  return (
    <Box as="section" aria-labelledby="about-take" marginTop="26px" maxWidth={{ base: 'none', lg: '484px' }}>
      <chakra.h2 id="about-take" fontSize="20px" lineHeight="27px" fontWeight={600} marginBottom="8px">
        About this take
      </chakra.h2>
      <TextField
        label="Title"
        value={newTake.state.title}
        onChange={newTake.writeTitle}
        maxLength={120}
        autoComplete="off"
      />
      <RoomChoice newTake={newTake} />
      <SetupChoice newTake={newTake} />
    </Box>
  );
}

const none = '';

/** Where it was recorded; not offered before there is a room. */
function RoomChoice({ newTake }: { newTake: NewTake }) {
  if (newTake.rooms.length === 0) return null;
  const nameOf = (id: string) => newTake.rooms.find((room) => room.id === id)?.name ?? 'none written down';
  return (
    <Box marginTop="12px">
      <SelectField
        label="Room"
        value={newTake.roomId ?? none}
        options={[none, ...newTake.rooms.map(({ id }) => id)]}
        words={nameOf}
        onChange={newTake.chooseRoom}
      />
    </Box>
  );
}

/** What it was recorded with; not offered before there is a setup. */
function SetupChoice({ newTake }: { newTake: NewTake }) {
  if (newTake.setups.length === 0) return null;
  const nameOf = (id: string) => newTake.setups.find((setup) => setup.id === id)?.name ?? 'none written down';
  return (
    <Box marginTop="12px">
      <SelectField
        label="Setup"
        value={newTake.setupId ?? none}
        options={[none, ...newTake.setups.map(({ id }) => id)]}
        words={nameOf}
        onChange={newTake.chooseSetup}
      />
    </Box>
  );
}

/** What is worth remembering; it, too, may still be written while the files travel. */
export function NewTakeNote({ newTake }: { newTake: NewTake }) {
  return (
    <Box marginTop="16px">
      <TextArea label="Note" value={newTake.state.note} onChange={newTake.writeNote} maxLength={4000} />
    </Box>
  );
}
