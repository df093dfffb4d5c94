import {
  emptySetup,
  SetupFields,
  TryOutSubject,
  TryOutUnit,
  updateSetupRequest,
  UserSettings,
} from '@thudline/contracts';
import { AppError } from '../errors/app-error';

interface Varied {
  subject: TryOutSubject;
  differs: string;
  unit: TryOutUnit;
  position: number | null;
  label: string;
}

type LengthUnit = UserSettings['lengthUnit'];

const cmPerInch = 2.54;
const longestName = 60;

/**
 * @param base - the setup the winner was recorded with; null where none was written down
 * @returns the base with what the try-out varied standing where the winner had it
 * @throws {AppError} `bad-request` the winner has no position, or one that a setup can't hold
 */
export function winnerSetupFields(
  base: SetupFields | null,
  varied: Varied,
  lengthUnit: LengthUnit,
): SetupFields {
  const fields = base ?? emptySetup;
  const where = positionWords(varied, lengthUnit);
  if (!where)
    throw new AppError('bad-request', 'Write down where the winner stood first: a setup needs its position.');
  const changed = { ...fields, ...changeOf(fields, varied, where), name: nameOf(fields.name, varied, where) };
  const checked = updateSetupRequest.safeParse(changed);
  if (checked.success) return changed;
  throw new AppError('bad-request', checked.error.issues[0]?.message ?? 'A setup can’t hold this position.');
}

function changeOf(fields: SetupFields, varied: Varied, where: string): Partial<SetupFields> {
  const { position, subject } = varied;
  if (position === null || subject === 'other') return { rest: restWith(fields.rest, varied, where) };
  const change: Record<Exclude<TryOutSubject, 'other'>, Partial<SetupFields>> = {
    'overhead-height': { overhead: { ...fields.overhead, aboveSnareCm: position } },
    'overhead-forward': { overhead: { ...fields.overhead, towardKickCm: position } },
    'kick-depth': { kick: { ...fields.kick, insideCm: position } },
    'kick-angle': { kick: { ...fields.kick, turnedDeg: position } },
  };
  return change[subject];
}

/** What was said there of the same thing gives way. */
function restWith(rest: string, varied: Varied, where: string): string {
  const head = `${thingWords(varied)}: `;
  const others = rest.split('; ').filter((part) => part !== '' && !part.startsWith(head));
  return [...others, `${head}${where}`].join('; ');
}

const things: Record<Exclude<TryOutSubject, 'other'>, string> = {
  'overhead-height': 'overhead',
  'overhead-forward': 'overhead toward the kick',
  'kick-depth': 'kick microphone inside',
  'kick-angle': 'kick microphone turned',
};

const thingWords = ({ subject, differs }: Varied) => (subject === 'other' ? differs : things[subject]);

/** "one overhead, high, overhead 112 cm"; a longer one is cut before its last part. */
function nameOf(base: string, varied: Varied, where: string): string {
  const thing = thingWords(varied);
  const last = `${thing} ${where}`.slice(0, longestName);
  const before = base.split(', ').filter((part) => part !== '' && !part.startsWith(`${thing} `));
  const room = longestName - last.length - 2;
  const kept = before.join(', ').slice(0, Math.max(0, room)).trim();
  return kept ? `${kept}, ${last}` : last;
}

/** "112 cm", "44.1 in", "30°", "felt"; null where nothing was written. */
function positionWords({ position, label, unit }: Varied, lengthUnit: LengthUnit): string | null {
  if (position === null || unit === 'label') return label || null;
  if (unit === 'degree') return `${shortNumber(position)}°`;
  if (unit === 'dB') return `${shortNumber(position)} dB`;
  return lengthUnit === 'foot' ? `${shortNumber(position / cmPerInch)} in` : `${shortNumber(position)} cm`;
}

const shortNumber = (value: number) => String(Math.round(value * 10) / 10).replace('-', '−');
