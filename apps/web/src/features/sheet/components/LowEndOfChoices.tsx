import { choiceLowEnd, type PairSpectrum } from '@thudline/dsp';
import type { NamedChoice } from '../hooks/choiceNames';
import type { Bench } from '../hooks/useChoice';
import { LowEndLine } from '../pictures/LowEndLine';

/** Without any low end in either file the two neither help nor harm. */
const lowEndDb = (spectrum: PairSpectrum, choice: NamedChoice) => choiceLowEnd(spectrum, choice) ?? 0;

const tick = (spectrum: PairSpectrum, choice: NamedChoice) => ({
  levelDb: lowEndDb(spectrum, choice),
  label: choice.tickLabel,
});

/** The low-end line of a bench: what is chosen, against as recorded, the other choices as ticks. */
export function LowEndOfChoices({ spectrum, bench }: { spectrum: PairSpectrum; bench: Bench }) {
  const { chosen, asRecorded, named } = bench;
  const others = named.filter((choice) => choice !== chosen && choice !== asRecorded);
  return (
    <LowEndLine
      recordedDb={lowEndDb(spectrum, asRecorded)}
      chosen={{ ...tick(spectrum, chosen), label: chosen.label }}
      others={others.map((choice) => tick(spectrum, choice))}
    />
  );
}
