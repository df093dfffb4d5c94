import { Box, chakra } from '@chakra-ui/react';
import type { RoomResponse, UserSettings } from '@thudline/contracts';
import { Link } from 'react-router-dom';
import { assumptions } from '../assumptions';
import type { KnownRoom } from '../knownRoom';
import type { TreatmentPlan } from '../treatmentPlan';

/** In the margin: what the estimate takes for granted. */
export function Assumptions({
  room,
  known,
  plan,
  schroederHz,
  settings,
}: {
  room: RoomResponse;
  known: KnownRoom;
  plan: TreatmentPlan;
  schroederHz: number | null;
  settings: UserSettings;
}) {
  return (
    <Box
      as="aside"
      aria-labelledby="assumptions-head"
      fontSize="small"
      lineHeight="21px"
      paddingX={{ lg: '20px' }}
    >
      <chakra.h2 id="assumptions-head" fontSize="16px" fontWeight={600} lineHeight="26px">
        What it takes for granted
      </chakra.h2>
      <chakra.ul listStyleType="none" marginTop="4px" borderTop="1px solid" borderColor="rule">
        {assumptions(known, plan, { schroederHz, settings }).map((sentence) => (
          <chakra.li key={sentence} borderBottom="1px solid" borderColor="rule" paddingY="7px">
            {sentence}
          </chakra.li>
        ))}
      </chakra.ul>
      <Box marginTop="8px">
        <Link to={`/rooms/${room.id}`}>Write down more of this room</Link>
      </Box>
    </Box>
  );
}
