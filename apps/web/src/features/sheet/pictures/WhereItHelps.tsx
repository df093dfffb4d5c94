import { Box } from '@chakra-ui/react';
import { thirdOctaveLevels, zoneLevels, type Choice, type PairSpectrum } from '@thudline/dsp';
import { useMemo } from 'react';
import { ThirdOctaveSteps } from './ThirdOctaveSteps';
import { ZoneRows } from './ZoneRows';

/** Five zones from low to high, ring to disc; beside them the same in third-octave steps. */
export function WhereItHelps({
  spectrum,
  asRecorded,
  chosen,
}: {
  spectrum: PairSpectrum;
  asRecorded: Choice;
  chosen: Choice & { label: string };
}) {
  const zones = useMemo(
    () => beside(zoneLevels(spectrum, asRecorded), zoneLevels(spectrum, chosen)),
    [spectrum, asRecorded, chosen],
  );
  const steps = useMemo(
    () => beside(thirdOctaveLevels(spectrum, asRecorded), thirdOctaveLevels(spectrum, chosen)),
    [spectrum, asRecorded, chosen],
  );
  return (
    <Box
      display="grid"
      gridTemplateColumns={{ base: '1fr', lg: '330px 1fr' }}
      gap={{ base: '20px', lg: '42px' }}
      marginTop="8px"
      breakInside="avoid"
      _print={{ gridTemplateColumns: '330px 1fr', gap: '42px' }}
    >
      <ZoneRows zones={zones} label={chosen.label} />
      <ThirdOctaveSteps steps={steps} label={chosen.label} />
    </Box>
  );
}

export type Beside<T> = Omit<T, 'levelDb'> & { levelDb: number; recordedDb: number };

/** As recorded beside chosen. A band in which neither microphone has anything neither helps nor harms. */
function beside<T extends { levelDb: number | null }>(recorded: T[], chosen: T[]): Beside<T>[] {
  return chosen.map((band, i) => ({
    ...band,
    levelDb: band.levelDb ?? 0,
    recordedDb: recorded[i].levelDb ?? 0,
  }));
}
