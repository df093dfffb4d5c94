import { Box } from '@chakra-ui/react';
import { TextLink } from '../../../components/TextLink';
import { useSampleSheet } from '../../landing/hooks/useSampleSheet';

/** For someone who wants to see first what a sheet says; nothing where there is no sheet to show. */
export function ReadSample() {
  const { takeId } = useSampleSheet();
  if (!takeId) return null;
  return (
    <Box lineHeight="25px">
      Nothing recorded yet?{' '}
      <TextLink to="/sample" fontWeight={600}>
        Read a sheet we made earlier
      </TextLink>
      . You can hear it and change it.
    </Box>
  );
}
