import { Box, chakra } from '@chakra-ui/react';
import { TextArea } from '../../../components/TextArea';
import { TextField } from '../../../components/TextField';
import type { NewTake } from '../hooks/useNewTake';

/** Title and note; both may still be written while the files travel. */
export function AboutTake({ newTake }: { newTake: NewTake }) {
  return (
    <Box as="section" aria-labelledby="about-take" marginTop="26px">
      <chakra.h2 id="about-take" fontSize="20px" lineHeight="27px" fontWeight={600} marginBottom="8px">
        About this take
      </chakra.h2>
      <Box maxWidth={{ base: 'none', lg: '484px' }} marginBottom="16px">
        <TextField
          label="Title"
          value={newTake.state.title}
          onChange={newTake.writeTitle}
          maxLength={120}
          autoComplete="off"
        />
      </Box>
      <TextArea label="Note" value={newTake.state.note} onChange={newTake.writeNote} maxLength={4000} />
    </Box>
  );
}
