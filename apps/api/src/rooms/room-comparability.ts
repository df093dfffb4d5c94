import { SetupFields, UserSettings } from '@thudline/contracts';
import { gainsAlike, setupRows } from '../comparisons/setup-rows';

/** Whether the takes around a change tell what it did, and nothing else. */
export interface Comparability {
  /** Why they can't be compared, as the end of a sentence; null where they can. */
  because: string | null;
  /** Both preamps are written down as alike: noise floors and the strength of hits compare. */
  gainKnownSame: boolean;
  /** A preamp is written down as turned: noise floors don't compare. */
  gainChanged: boolean;
  /** Whole sentences. */
  caveats: string[];
}

interface SideSetups {
  /** One a take; null where nothing is written down. */
  before: readonly (SetupFields | null)[];
  after: readonly (SetupFields | null)[];
  lengthUnit: UserSettings['lengthUnit'];
}

/** What the setups of the takes before and after a change say of everything else. */
export function comparability({ before, after, lengthUnit }: SideSetups): Comparability {
  const [known, others] = [written(before), written(after)];
  const pairs = known.flatMap((one) => others.map((other) => [one, other] as const));
  const allWritten = known.length === before.length && others.length === after.length;
  const gains = pairs.map(([one, other]) => gainsAlike(one, other));
  const gainChanged = gains.includes(false);
  const rows = pairs.flatMap(([one, other]) => bothTold(setupRows(one, other, lengthUnit)));
  return {
    because: firstOf(rows.map(reasonOf)),
    gainKnownSame: allWritten && gains.every((alike) => alike === true),
    gainChanged,
    caveats: [
      ...(allWritten
        ? []
        : ['Not every take has its setup written down: nobody knows whether the microphones stood alike.']),
      ...(gainChanged ? [gainCaveat(rows)] : []),
      ...restCaveats(rows),
    ],
  };
}

/** Other changes that lie between the takes on both sides, by number. */
export function betweenCaveat(numbers: readonly number[]): string[] {
  if (numbers.length === 0) return [];
  const [changes, verb] = numbers.length === 1 ? ['Change', 'lies'] : ['Changes', 'lie'];
  return [`${changes} ${listed(numbers.map(String))} ${verb} between these takes as well.`];
}

const written = (setups: readonly (SetupFields | null)[]) => setups.filter((setup) => setup !== null);

type Row = ReturnType<typeof setupRows>[number];

/** What isn't written down on one side differs in nothing that is known. */
const bothTold = (rows: readonly Row[]) => rows.filter(({ before, after }) => before !== '' && after !== '');

const firstOf = (reasons: readonly (string | null)[]) => reasons.find((reason) => reason !== null) ?? null;

/** "the kick microphone moved as well, from 0 cm to 5 cm inside" */
function reasonOf({ what, before, after }: Row): string | null {
  const [role = '', where] = what.split(', ', 2);
  if (where !== undefined)
    return `the ${microphone(role)} moved as well, from ${before} to ${after} ${placeWords[where] ?? where}`;
  if (what.endsWith('microphone')) return `it is another ${what} as well: ${before} before, ${after} after`;
  if (what === 'interface') return `it was recorded with something else as well: ${before}, then ${after}`;
  if (what.endsWith('low cut')) return `the ${what} was switched as well`;
  return null;
}

const microphone = (role: string) => (role === 'kick' ? 'kick microphone' : role);
const placeWords: Record<string, string> = {
  height: 'above the floor',
  'off centre': 'off the middle',
  'above the snare': 'above the snare',
};

function gainCaveat(rows: readonly Row[]): string {
  const turned = rows.find(({ what }) => what.endsWith('preamp'));
  const how = turned ? `, from ${turned.before} to ${turned.after}` : '';
  return `The ${turned?.what ?? 'preamps'} changed as well${how}: noise and low end aren’t compared.`;
}

const restCaveats = (rows: readonly Row[]) =>
  [
    ...new Map(
      rows.filter(({ what }) => what === 'the rest').map((row) => [row.before + row.after, row]),
    ).values(),
  ]
    .slice(0, 1)
    .map(({ before, after }) => `Noted of the setups besides: “${before}” before, “${after}” after.`);

function listed(words: readonly string[]): string {
  const [last = ''] = words.slice(-1);
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}
