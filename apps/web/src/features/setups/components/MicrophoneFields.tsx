import { Box, chakra } from '@chakra-ui/react';
import { useId, type ReactNode } from 'react';
import { TextField } from '../../../components/TextField';
import { degree, type FieldUnit } from '../fieldUnits';
import type { SetupDraft } from '../hooks/useSetupDraft';
import { MeasureField } from './MeasureField';

interface FieldsProps {
  draft: SetupDraft;
  length: FieldUnit;
}

export function KickFields({ draft, length }: FieldsProps) {
  const { kick } = draft.fields;
  const write = (change: Partial<typeof kick>) => draft.writeIn('kick', change);
  return (
    <SetupPart title="Kick microphone" color="kick">
      <ThreeColumns>
        <MeasureField
          label="Inside the front hole"
          value={kick.insideCm}
          unit={length}
          onChange={(insideCm) => write({ insideCm })}
        />
        <MeasureField
          label="Off the centre"
          value={kick.offCentreCm}
          unit={length}
          onChange={(offCentreCm) => write({ offCentreCm })}
        />
        <MeasureField
          label="Height"
          value={kick.heightCm}
          unit={length}
          onChange={(heightCm) => write({ heightCm })}
        />
        <MeasureField
          label="Turned away"
          value={kick.turnedDeg}
          unit={degree}
          onChange={(turnedDeg) => write({ turnedDeg })}
        />
        <WhichOne value={kick.which} onChange={(which) => write({ which })} />
      </ThreeColumns>
      <FieldsHint>In front of the hole: write it with a minus. Off the centre: to your right.</FieldsHint>
    </SetupPart>
  );
}

export function OverheadFields({ draft, length }: FieldsProps) {
  const { overhead } = draft.fields;
  const write = (change: Partial<typeof overhead>) => draft.writeIn('overhead', change);
  return (
    <SetupPart title="Overhead" color="overhead">
      <ThreeColumns>
        <MeasureField
          label="Above the snare"
          value={overhead.aboveSnareCm}
          unit={length}
          onChange={(aboveSnareCm) => write({ aboveSnareCm })}
        />
        <MeasureField
          label="Toward the kick"
          value={overhead.towardKickCm}
          unit={length}
          onChange={(towardKickCm) => write({ towardKickCm })}
        />
        <MeasureField
          label="Away from the hat"
          value={overhead.awayFromHatCm}
          unit={length}
          onChange={(awayFromHatCm) => write({ awayFromHatCm })}
        />
        <MeasureField
          label="Tilted"
          value={overhead.tiltedDeg}
          unit={degree}
          onChange={(tiltedDeg) => write({ tiltedDeg })}
        />
        <WhichOne value={overhead.which} onChange={(which) => write({ which })} />
      </ThreeColumns>
      <FieldsHint>Hang it from its stand’s own clamp, weighted, and never over anybody’s head.</FieldsHint>
    </SetupPart>
  );
}

const WhichOne = ({ value, onChange }: { value: string; onChange: (value: string) => void }) => (
  <Box gridColumn={{ base: '1 / -1', sm: '2 / -1' }}>
    <TextField label="Which one" value={value} onChange={onChange} maxLength={80} autoComplete="off" />
  </Box>
);

/** One ruled part of the form, named in its microphone's colour. */
export function SetupPart({
  title,
  color = 'ink',
  children,
}: {
  title: string;
  color?: 'ink' | 'kick' | 'overhead';
  children: ReactNode;
}) {
  const id = useId();
  return (
    <Box as="section" aria-labelledby={id} marginTop="16px">
      <chakra.h2 id={id} fontSize="20px" lineHeight="27px" fontWeight={600} color={color} marginBottom="4px">
        {title}
      </chakra.h2>
      {children}
    </Box>
  );
}

export const ThreeColumns = chakra('div', {
  base: {
    display: 'grid',
    gridTemplateColumns: { base: 'repeat(2, minmax(0, 1fr))', sm: 'repeat(3, minmax(0, 1fr))' },
    columnGap: '22px',
    rowGap: '9px',
    alignItems: 'start',
  },
});

export const FieldsHint = chakra('p', {
  base: { fontSize: 'caption', color: 'ink.muted', marginTop: '6px' },
});
