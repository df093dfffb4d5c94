import { Box } from '@chakra-ui/react';
import type { RoomResponse, UserSettings } from '@thudline/contracts';
import { Headline } from '../../../components/Headline';
import { temperature } from '../../../lib/format';
import { RuledSheet, SheetRow } from '../../sheet/components/RuledSheet';
import { headWords, measuresWords, planWords, tailsSentence } from '../calculatorWords';
import { useCalculator } from '../hooks/useCalculator';
import type { KnownRoom } from '../knownRoom';
import { anotherPlan } from '../treatmentPlan';
import { getTreatment } from '../treatments';
import { Assumptions } from './Assumptions';
import { ModesPart } from './ModesPart';
import { PlanButtons } from './PlanButtons';
import { PlanSentence } from './PlanSentence';
import { BuildingCaution, MeasuredNote } from './TailNotes';
import { TailsPart } from './TailsPart';

/** What a treatment would do to a room, before anything is bought. */
export function CalculatorSheet({
  room,
  known,
  settings,
  readOnly,
}: {
  room: RoomResponse;
  known: KnownRoom;
  settings: UserSettings;
  readOnly: boolean;
}) {
  const { lengthUnit, temperatureUnit } = settings;
  const { plan, setPlan, estimate, resonances } = useCalculator(known);
  const { bands, schroederHz } = estimate;
  const { short } = getTreatment(plan.treatmentId);
  const { strong, rest } = headWords({ bands, plan, resonances }, lengthUnit);
  const about = [measuresWords(known, lengthUnit), temperature(known.temperatureC, temperatureUnit)];
  return (
    <RuledSheet>
      <SheetRow note={<Assumptions {...{ room, known, plan, schroederHz, settings }} />}>
        <Box color="ink.muted" fontSize="small" lineHeight="22px">
          {room.name} · an estimate before you spend anything · {about.join(', ')}
        </Box>
        <Headline marginTop="4px">
          <b>{strong}</b> {rest}
        </Headline>
        <PlanSentence {...{ plan, lengthUnit }} room={known} onChange={setPlan} />
        <ModesPart {...{ room, known, resonances, plan, lengthUnit }} />
      </SheetRow>
      <SheetRow
        note={
          <Box marginTop={{ lg: '24px' }} display="flex" flexDirection="column" gap="32px">
            <MeasuredNote roomId={room.id} bands={bands} />
            <BuildingCaution />
          </Box>
        }
      >
        <TailsPart bands={bands} short={short} />
        <PlanButtons
          roomId={room.id}
          entry={{
            what: planWords(plan, lengthUnit),
            told: `${strong} ${rest} ${tailsSentence(bands)}`,
            isSoft: plan.spot !== 'floor',
          }}
          readOnly={readOnly}
          onAnother={() => setPlan(anotherPlan(plan, known))}
        />
      </SheetRow>
    </RuledSheet>
  );
}
