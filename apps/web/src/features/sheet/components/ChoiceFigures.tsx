import { Box } from '@chakra-ui/react';
import {
  choiceLowEnd,
  deepestThirdOctave,
  thirdOctaves,
  type Choice,
  type PairSpectrum,
} from '@thudline/dsp';
import { signedDecibels } from '../../../lib/format';

/** What the choice does in two figures: the low end, and the third-octave that loses most. */
export function ChoiceFigures({
  spectrum,
  asRecorded,
  chosen,
}: {
  spectrum: PairSpectrum;
  asRecorded: Choice;
  chosen: Choice & { label: string };
}) {
  const now = deepestThirdOctave(spectrum, chosen);
  const before = deepestThirdOctave(spectrum, asRecorded);
  const lowEndDb = choiceLowEnd(spectrum, chosen);
  if (!now || !before || lowEndDb === null) return null;
  const same = chosen.label === 'as recorded';
  return (
    <Box fontSize="small" color="ink.muted" marginTop="12px">
      Low end of the two added, {chosen.label}:{' '}
      <b data-low-end-db={lowEndDb.toFixed(4)}>{signedDecibels(lowEndDb, 2)}</b>. Deepest third-octave:{' '}
      {bandWords(now)}
      {same ? '' : `; as recorded ${bandWords(before)}`}.
    </Box>
  );
}

function bandWords({ centreHz, levelDb }: { centreHz: number; levelDb: number }): string {
  const band = thirdOctaves.find((each) => Math.abs(each.centreHz / centreHz - 1) < 0.01);
  return `${band?.nominal ?? Math.round(centreHz)} Hz, ${signedDecibels(levelDb)}`;
}
