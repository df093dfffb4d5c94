import { chakra } from '@chakra-ui/react';
import type { UserSettings } from '@thudline/contracts';
import { speedOfSoundMPerS } from '@thudline/dsp';
import { useState } from 'react';
import { FieldError } from '../../../components/FieldError';
import { InlineNumber } from '../../../components/InlineNumber';
import { InlineSelect } from '../../../components/InlineSelect';
import { number } from '../../../lib/format';
import { useKept } from '../hooks/useKept';
import { temperatureScale } from '../temperatureScale';
import { NotKept } from './Kept';
import { SettingsSection } from './SettingsSection';

const lengthWords = { metre: 'metres', foot: 'feet and inches' } as const;
const temperatureWords = { celsius: '°C', fahrenheit: '°F' } as const;
const metresPerFoot = 0.3048;

/** Units, and the temperature that the speed of sound follows. */
export function UnitsSection({ settings }: { settings: UserSettings }) {
  const { keep, kept, failure } = useKept();
  const [refused, setRefused] = useState(false);
  const { lengthUnit, temperatureUnit, temperatureC } = settings;
  const scale = temperatureScale(temperatureUnit);
  return (
    <SettingsSection title="Units" kept={kept}>
      <chakra.p lineHeight={{ base: '40px', lg: '36px' }}>
        Lengths in{' '}
        <InlineSelect
          label="Lengths in"
          value={lengthUnit}
          options={['metre', 'foot']}
          words={(unit) => lengthWords[unit]}
          onChange={(unit) => void keep({ settings: { lengthUnit: unit } })}
        />
        , temperature in{' '}
        <InlineSelect
          label="Temperature in"
          value={temperatureUnit}
          options={['celsius', 'fahrenheit']}
          words={(unit) => temperatureWords[unit]}
          onChange={(unit) => void keep({ settings: { temperatureUnit: unit } })}
        />
        . Where you play it is{' '}
        <InlineNumber
          label="Temperature where you play"
          value={scale.fromCelsius(temperatureC)}
          digits={0}
          step={1}
          min={scale.min}
          max={scale.max}
          unit={temperatureWords[temperatureUnit]}
          whenLeft
          onRefused={() => setRefused(true)}
          onChange={(value) => {
            setRefused(false);
            void keep({ settings: { temperatureC: scale.toCelsius(value) } });
          }}
        />
        , so sound travels at {speedWords(temperatureC, lengthUnit)}.
      </chakra.p>
      {refused && (
        <FieldError>
          Write a temperature between {number(scale.min, 0)} and {number(scale.max, 0)}{' '}
          {temperatureWords[temperatureUnit]}.
        </FieldError>
      )}
      <NotKept failure={failure} />
    </SettingsSection>
  );
}

function speedWords(temperatureC: number, unit: UserSettings['lengthUnit']): string {
  const speedMPerS = speedOfSoundMPerS(temperatureC);
  return unit === 'foot'
    ? `${number(speedMPerS / metresPerFoot, 0)} feet a second`
    : `${number(speedMPerS, 0)} m/s`;
}
