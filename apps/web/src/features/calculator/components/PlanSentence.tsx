import { Box } from '@chakra-ui/react';
import { InlineNumber, parseNumber } from '../../../components/InlineNumber';
import { InlineSelect } from '../../../components/InlineSelect';
import {
  areaUnit,
  areaWords,
  keptArea,
  shownArea,
  thicknessWords,
  type LengthUnit,
} from '../calculatorWords';
import type { KnownRoom } from '../knownRoom';
import { roomFor, spotsOf, spotWords } from '../spots';
import type { TreatmentPlan } from '../treatmentPlan';
import { getTreatment, treatments } from '../treatments';

/** "Try **8 m²** of **mineral wool**, **10 cm thick**, on **both long walls**": every word in it can be changed. */
export function PlanSentence({
  plan,
  room,
  lengthUnit,
  onChange,
}: {
  plan: TreatmentPlan;
  room: KnownRoom;
  lengthUnit: LengthUnit;
  onChange: (plan: TreatmentPlan) => void;
}) {
  const mostM2 = roomFor(plan.spot, room);
  const shown = shownArea(plan.areaM2, lengthUnit);
  const { layers } = getTreatment(plan.treatmentId);
  const spots = spotsOf(room);
  return (
    <Box marginTop="14px" lineHeight="36px">
      Try{' '}
      <InlineNumber
        label={`How much, ${areaUnit(lengthUnit)}`}
        value={shown}
        digits={Math.abs(shown - Math.round(shown)) < 0.05 ? 0 : 1}
        step={lengthUnit === 'metre' ? 0.5 : 5}
        min={lengthUnit === 'metre' ? 0.5 : 5}
        max={shownArea(mostM2, lengthUnit)}
        unit={areaUnit(lengthUnit)}
        whenLeft
        read={(text) => parseNumber(text.replace(/\s*(m|ft|sq)[^\d]*[²2]?\s*$/i, ''))}
        onChange={(area) => onChange({ ...plan, areaM2: keptArea(area, lengthUnit) })}
      />{' '}
      of{' '}
      <InlineSelect
        label="Material"
        value={plan.treatmentId}
        options={treatments.map(({ id }) => id)}
        words={(id) => getTreatment(id).words}
        onChange={(treatmentId) => onChange({ ...plan, treatmentId })}
      />
      {layers.length > 1 && (
        <>
          ,{' '}
          <InlineSelect
            label="Thickness"
            value={String(plan.thicknessCm)}
            options={layers.map(({ thicknessCm }) => String(thicknessCm))}
            words={(cm) => thicknessWords(Number(cm), lengthUnit)}
            onChange={(cm) => onChange({ ...plan, thicknessCm: Number(cm) })}
          />
        </>
      )}
      , on{' '}
      {spots.length > 1 ? (
        <InlineSelect
          label="Where"
          value={plan.spot}
          options={spots}
          words={(spot) => spotWords[spot]}
          onChange={(spot) => onChange({ ...plan, spot })}
        />
      ) : (
        spotWords[plan.spot]
      )}
      {plan.areaM2 >= mostM2 - 0.1 && (
        <Box fontSize="caption" color="ink.muted" lineHeight="20px">
          That is all there is: {areaWords(mostM2, lengthUnit)}.
        </Box>
      )}
    </Box>
  );
}
