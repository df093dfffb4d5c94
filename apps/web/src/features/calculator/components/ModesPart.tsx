import { Box, Flex, Grid, chakra } from '@chakra-ui/react';
import type { RoomResponse } from '@thudline/contracts';
import { useState } from 'react';
import { TextButton } from '../../../components/Button';
import { kitSentence, type LengthUnit } from '../calculatorWords';
import { kitHint } from '../kitHint';
import type { KnownRoom } from '../knownRoom';
import { ModePlan } from '../pictures/ModePlan';
import { ModeStrip } from '../pictures/ModeStrip';
import { softOnWalls } from '../pictures/wallStretches';
import { modeKey, type RoomResonances } from '../roomResonances';
import type { TreatmentPlan } from '../treatmentPlan';
import { getTreatment } from '../treatments';
import { ModeTable } from './ModeTable';
import { PartHead } from './PartHead';

interface ModesPartProps {
  room: RoomResponse;
  known: KnownRoom;
  resonances: RoomResonances | null;
  plan: TreatmentPlan;
  lengthUnit: LengthUnit;
}

/** Where the low notes gather: along an axis, in a list, and on the room's own plan. */
export function ModesPart({ room, known, resonances, plan, lengthUnit }: ModesPartProps) {
  const [chosenKey, setChosenKey] = useState<string | null>(null);
  const [showsAll, setShowsAll] = useState(false);
  const { size } = known;
  const chosen = resonances?.all.find((mode) => modeKey(mode) === chosenKey) ?? resonances?.first;
  return (
    <Box as="section" aria-labelledby="modes-head">
      <PartHead id="modes-head">Where the low notes gather</PartHead>
      {!resonances || !size || !chosen ? (
        <Box marginTop="6px">
          Can’t tell: this room is not a box, and its resonances can’t be worked out from a volume. Sit where
          you play, have somebody hit the kick, and walk: where it turns thin, the room gives nothing.
        </Box>
      ) : (
        <>
          <Box marginTop="6px" aria-live="polite">
            {kitSentence(chosen, room.kit && kitHint(chosen, size, room.kit), lengthUnit)}
          </Box>
          <ModeStrip {...{ resonances, chosen }} onChoose={(mode) => setChosenKey(modeKey(mode))} />
          <Grid
            templateColumns={{ base: 'minmax(0, 1fr)', md: 'minmax(0, 1fr) 228px' }}
            gap={{ base: '14px', md: '16px' }}
            marginTop="10px"
          >
            <ModePlan {...{ room, size, plan, lengthUnit }} surfaces={known.surfaces} mode={chosen} />
            <ModeTable
              {...{ resonances, chosen, showsAll }}
              onChoose={(mode) => setChosenKey(modeKey(mode))}
            />
          </Grid>
          <Flex justifyContent="space-between" wrap="wrap" columnGap="24px" marginTop="6px">
            <Legend plan={plan} hasSoft={softOnWalls(known.surfaces, size).length > 0} />
            <TextButton
              fontSize="small"
              paddingY="8px"
              aria-expanded={showsAll}
              onClick={() => setShowsAll(!showsAll)}
            >
              {showsAll ? 'fewer modes' : 'all modes'}
            </TextButton>
          </Flex>
        </>
      )}
    </Box>
  );
}

function Legend({ plan, hasSoft }: { plan: TreatmentPlan; hasSoft: boolean }) {
  const { short } = getTreatment(plan.treatmentId);
  const isFlat = plan.spot === 'floor' || plan.spot === 'ceiling';
  const words = [
    'tall stroke: along one direction, middle: two, short: three',
    `${isFlat ? 'dashes' : 'bars'}: the planned ${short}`,
    hasSoft && 'wave: soft already',
  ].filter(Boolean);
  return (
    <Flex fontSize="caption" color="ink.muted" columnGap="20px" wrap="wrap" paddingY="8px" lineHeight="20px">
      {words.map((each) => (
        <chakra.span key={String(each)}>{each}</chakra.span>
      ))}
    </Flex>
  );
}
