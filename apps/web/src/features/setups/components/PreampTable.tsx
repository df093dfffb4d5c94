import { Box, chakra } from '@chakra-ui/react';
import type { Preamp } from '@thudline/contracts';
import { CheckBox } from '../../../components/CheckBox';
import { decibel } from '../fieldUnits';
import type { SetupDraft } from '../hooks/useSetupDraft';
import { FieldsHint, SetupPart } from './MicrophoneFields';
import { MeasureCell } from './MeasureField';

const switches = [
  ['polarity', 'polarity'],
  ['pad', 'pad'],
  ['lowCut', 'low cut'],
  ['phantom', 'phantom'],
] as const;

/** Gain and switches of both preamps, as they stand on the box. */
export function PreampTable({ draft }: { draft: SetupDraft }) {
  return (
    <SetupPart title="Preamps">
      <Box overflowX="auto">
        <chakra.table width="100%" borderCollapse="collapse">
          <thead>
            <tr>
              <Head aria-label="microphone" />
              <Head scope="col">gain</Head>
              {switches.map(([key, name]) => (
                <Head key={key} scope="col">
                  {name}
                </Head>
              ))}
            </tr>
          </thead>
          <tbody>
            <PreampRow
              name="kick"
              preamp={draft.fields.kickPreamp}
              onChange={(change) => draft.writeIn('kickPreamp', change)}
            />
            <PreampRow
              name="overhead"
              preamp={draft.fields.overheadPreamp}
              onChange={(change) => draft.writeIn('overheadPreamp', change)}
            />
          </tbody>
        </chakra.table>
      </Box>
      <FieldsHint>Mute the monitors before you press polarity or phantom power.</FieldsHint>
    </SetupPart>
  );
}

function PreampRow({
  name,
  preamp,
  onChange,
}: {
  name: 'kick' | 'overhead';
  preamp: Preamp;
  onChange: (change: Partial<Preamp>) => void;
}) {
  return (
    <tr>
      <chakra.th
        scope="row"
        {...cell}
        textAlign="left"
        color={name}
        fontWeight={600}
        fontSize="16px"
        paddingRight="12px"
      >
        {name}
      </chakra.th>
      <chakra.td {...cell} width={{ base: '76px', sm: '96px' }}>
        <MeasureCell
          label={`${name} gain`}
          value={preamp.gainDb}
          unit={decibel}
          onChange={(gainDb) => onChange({ gainDb })}
        />
      </chakra.td>
      {switches.map(([key, word]) => (
        <chakra.td key={key} {...cell} textAlign="center">
          <CheckBox
            checked={preamp[key]}
            label={`${name} ${word}`}
            onChange={(pressed) => onChange({ [key]: pressed })}
          />
        </chakra.td>
      ))}
    </tr>
  );
}

const cell = { borderTop: '1px solid', borderColor: 'rule', paddingY: '4px' } as const;

const Head = chakra('th', {
  base: { fontSize: 'caption', fontWeight: 600, paddingX: { base: '3px', sm: '6px' }, paddingBottom: '4px' },
});
