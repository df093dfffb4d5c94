import { DifferedRow, SetupFields, UserSettings } from '@thudline/contracts';

type LengthUnit = UserSettings['lengthUnit'];

interface Field {
  what: string;
  /** Told together where it is the same in both setups; null: never told as the same. */
  group: 'positions' | 'microphones' | 'preamps and switches' | null;
  /** Empty where it is not written down. */
  told: (setup: SetupFields, unit: LengthUnit) => string;
}

const cmInAnInch = 2.54;
const minus = '−';

function numberText(value: number, decimals: number): string {
  const text = Number(Math.abs(value).toFixed(decimals));
  return `${value < 0 && text !== 0 ? minus : ''}${text}`;
}

const length = (cm: number | null, unit: LengthUnit) => {
  if (cm === null) return '';
  return unit === 'metre' ? `${numberText(cm, 0)} cm` : `${numberText(cm / cmInAnInch, 1)} in`;
};
const angle = (deg: number | null) => (deg === null ? '' : `${numberText(deg, 0)}°`);
const gain = (db: number | null) => (db === null ? '' : `${numberText(db, 1)} dB`);
const pressed = (on: boolean) => (on ? 'pressed' : 'not pressed');

const positions: Field[] = [
  { what: 'kick, inside', told: ({ kick }, unit) => length(kick.insideCm, unit), group: 'positions' },
  { what: 'kick, off centre', told: ({ kick }, unit) => length(kick.offCentreCm, unit), group: 'positions' },
  { what: 'kick, height', told: ({ kick }, unit) => length(kick.heightCm, unit), group: 'positions' },
  { what: 'kick, turned', told: ({ kick }) => angle(kick.turnedDeg), group: 'positions' },
  {
    what: 'overhead, above the snare',
    told: ({ overhead }, unit) => length(overhead.aboveSnareCm, unit),
    group: 'positions',
  },
  {
    what: 'overhead, toward the kick',
    told: ({ overhead }, unit) => length(overhead.towardKickCm, unit),
    group: 'positions',
  },
  {
    what: 'overhead, away from the hat',
    told: ({ overhead }, unit) => length(overhead.awayFromHatCm, unit),
    group: 'positions',
  },
  { what: 'overhead, tilted', told: ({ overhead }) => angle(overhead.tiltedDeg), group: 'positions' },
];

const switches: Field[] = (['kick', 'overhead'] as const).flatMap((role) => {
  const field = (what: string, told: (preamp: SetupFields['kickPreamp']) => string): Field => ({
    what: `${role} ${what}`,
    told: (setup) => told(setup[`${role}Preamp`]),
    group: 'preamps and switches',
  });
  return [
    field('polarity', ({ polarity }) => pressed(polarity)),
    field('preamp', ({ gainDb }) => gain(gainDb)),
    field('pad', ({ pad }) => pressed(pad)),
    field('low cut', ({ lowCut }) => pressed(lowCut)),
  ];
});

const others: Field[] = [
  { what: 'kick microphone', told: ({ kick }) => kick.which, group: 'microphones' },
  { what: 'overhead microphone', told: ({ overhead }) => overhead.which, group: 'microphones' },
  { what: 'interface', told: (setup) => setup.interface, group: null },
  { what: 'the rest', told: ({ rest }) => rest, group: null },
];

const fields = [...switches, ...positions, ...others];

/** Every field in which two setups differ, as written down, in the reader's units. */
export function setupRows(before: SetupFields, after: SetupFields, unit: LengthUnit): DifferedRow[] {
  return fields
    .map(({ what, told }) => ({ what, before: told(before, unit), after: told(after, unit) }))
    .filter((row) => row.before !== row.after);
}

/** Which groups of fields are the same in both setups, and say something. */
export function sameGroups(before: SetupFields, after: SetupFields): string[] {
  const groups = ['positions', 'preamps and switches', 'microphones'] as const;
  return groups.filter((group) => {
    const own = fields.filter((field) => field.group === group);
    const differs = own.some(({ told }) => told(before, 'metre') !== told(after, 'metre'));
    return !differs && own.some(({ told }) => told(before, 'metre') !== '');
  });
}

/** Whether the polarity switches of the two microphones stand to each other otherwise than before. */
export function switchedBetween(before: SetupFields, after: SetupFields): boolean {
  const opposite = ({ kickPreamp, overheadPreamp }: SetupFields) =>
    kickPreamp.polarity !== overheadPreamp.polarity;
  return opposite(before) !== opposite(after);
}

/** Whether both preamps are written down as alike; null where a gain isn't. */
export function gainsAlike(before: SetupFields, after: SetupFields): boolean | null {
  const roles = ['kickPreamp', 'overheadPreamp'] as const;
  const pairs = roles.map((role) => [before[role], after[role]] as const);
  if (pairs.some(([one, other]) => one.pad !== other.pad)) return false;
  if (pairs.some(([one, other]) => one.gainDb === null || other.gainDb === null)) return null;
  return pairs.every(([one, other]) => one.gainDb === other.gainDb);
}
