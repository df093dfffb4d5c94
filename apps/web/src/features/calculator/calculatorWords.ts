import type { RoomTrendResponse, UserSettings } from '@thudline/contracts';
import type { RoomMode } from '@thudline/dsp';
import { hertz, number } from '../../lib/format';
import type { KitHint, WallOnPlan } from './kitHint';
import type { KnownRoom, MissingMeasure } from './knownRoom';
import { meanHz, type RoomResonances } from './roomResonances';
import { spotWords } from './spots';
import type { BandEstimate } from './tailEstimate';
import type { TreatmentPlan } from './treatmentPlan';
import { getTreatment } from './treatments';

export type LengthUnit = UserSettings['lengthUnit'];

const feetInAMetre = 3.28084;
const cmInAnInch = 2.54;

/** As many digits as it has, one at most: "8 m²", "4.5 m²". */
const short = (value: number) => number(value, Math.abs(value - Math.round(value)) < 0.05 ? 0 : 1);

export const areaUnit = (unit: LengthUnit) => (unit === 'metre' ? 'm²' : 'ft²');
/** Square metres in the reader's unit. */
export const shownArea = (areaM2: number, unit: LengthUnit) =>
  unit === 'metre' ? areaM2 : areaM2 * feetInAMetre ** 2;
export const keptArea = (shown: number, unit: LengthUnit) =>
  unit === 'metre' ? shown : shown / feetInAMetre ** 2;
export const areaWords = (areaM2: number, unit: LengthUnit) =>
  `${unit === 'metre' ? short(areaM2) : number(shownArea(areaM2, unit), 0)} ${areaUnit(unit)}`;

/** "5.20 m", "17.1 ft". */
export const lengthWords = (metres: number, unit: LengthUnit) =>
  unit === 'metre' ? `${number(metres, 2)} m` : `${number(metres * feetInAMetre, 1)} ft`;

/** "5.20 × 3.10 × 2.40 m, 38.7 m³", or the volume alone. */
export function measuresWords(
  { size, volumeM3 }: Pick<KnownRoom, 'size' | 'volumeM3'>,
  unit: LengthUnit,
): string {
  const [factor, digits, name] = unit === 'metre' ? [1, 2, 'm'] : [feetInAMetre, 1, 'ft'];
  const volume = `${number(volumeM3 * factor ** 3, unit === 'metre' ? 1 : 0)} ${name}³`;
  if (!size) return `not a box, ${volume}`;
  const sides = [size.lengthM, size.widthM, size.heightM].map((side) => number(side * factor, digits));
  return `${sides.join(' × ')} ${name}, ${volume}`;
}

/** For whoever can't see the plan. */
export const spotOnPlanWords = ({ treatmentId, spot }: TreatmentPlan) =>
  `The planned ${getTreatment(treatmentId).short} is drawn on ${spotWords[spot]}.`;

export const thicknessWords = (thicknessCm: number, unit: LengthUnit) =>
  unit === 'metre' ? `${thicknessCm} cm thick` : `${number(thicknessCm / cmInAnInch, 0)} in thick`;

/** "8 m² of mineral wool, 48 kg/m³, 10 cm thick, on both long walls". */
export function planWords(plan: TreatmentPlan, unit: LengthUnit): string {
  const thick = plan.thicknessCm === null ? '' : `, ${thicknessWords(plan.thicknessCm, unit)}`;
  const { words } = getTreatment(plan.treatmentId);
  return `${areaWords(plan.areaM2, unit)} of ${words}${thick}, on ${spotWords[plan.spot]}`;
}

export const bandName = (centreHz: number) =>
  centreHz >= 1000 ? `${centreHz / 1000} kHz` : `${centreHz} Hz`;

export const tailText = (seconds: number | null, digits = 2) =>
  seconds === null ? '–' : number(seconds, digits);

/** Below half a second by far, a tail is no trouble for drums; ours. */
const shortAlreadyS = 0.5;
const halved = 0.55;
const worthSaying = 0.9;
/** Nothing thinner than this part of a wave holds it; the table begins with the octave above. */
const tableBeginsHz = 88;

const ratioOf = ({ before, after }: BandEstimate): number =>
  before.eyringS === null || after.eyringS === null || before.eyringS === 0
    ? 1
    : after.eyringS / before.eyringS;

/** "**8 m² of wool would calm 500 Hz:** 0.7 s becomes about 0.3. The boom at 65 Hz stays." */
export function headWords(
  {
    bands,
    plan,
    resonances,
  }: { bands: readonly BandEstimate[]; plan: TreatmentPlan; resonances: RoomResonances | null },
  unit: LengthUnit,
): { strong: string; rest: string } {
  const what = `${areaWords(plan.areaM2, unit)} of ${getTreatment(plan.treatmentId).short}`;
  const band = bands.find(({ centreHz }) => centreHz === 500) ?? bands[0];
  const ratio = ratioOf(band);
  const does = ratio <= 0.65 ? 'would calm' : ratio <= worthSaying ? 'would shorten' : 'would hardly change';
  const { eyringS: nowS } = band.before;
  const { eyringS: thenS } = band.after;
  const digits = tailText(nowS, 1) === tailText(thenS, 1) ? 2 : 1;
  const told = `${tailText(nowS, digits)} s becomes about ${tailText(thenS, digits)}.`;
  return {
    strong: `${what} ${does} ${bandName(band.centreHz)}:`,
    rest: [told, stays(resonances)].filter(Boolean).join(' '),
  };
}

function stays(resonances: RoomResonances | null): string {
  if (!resonances) return '';
  const { boom, first } = resonances;
  const hz = boom ? meanHz(boom) : first.frequencyHz;
  if (hz >= tableBeginsHz) return '';
  return `The ${boom ? 'boom' : 'resonance'} at ${number(hz, 0)} Hz stays.`;
}

/** "Up to 500 Hz the tail would halve or better; the higher bands are short already." */
export function tailsSentence(bands: readonly BandEstimate[]): string {
  const ratios = bands.map(ratioOf);
  const halving = bands.filter((_, i) => ratios[i] <= halved);
  if (halving.length === bands.length) return 'In every octave the tail would halve or better.';
  if (halving.length === 0) {
    const best = ratios.indexOf(Math.min(...ratios));
    return ratios[best] > worthSaying
      ? 'Hardly anything changes: less than a tenth in every octave.'
      : `It does most at ${bandName(bands[best].centreHz)}: ${number((1 - ratios[best]) * 100, 0)} % shorter.`;
  }
  const rest = bands.filter((band) => !halving.includes(band));
  const restIsShort = rest.every(({ before }) => before.eyringS !== null && before.eyringS < shortAlreadyS);
  const restIsHigher = rest[0].centreHz > halving[halving.length - 1].centreHz;
  const others = restIsHigher ? 'the higher octaves' : 'the others';
  return `${whereHalved(bands, halving)} the tail would halve or better; ${
    restIsShort ? `${others} are short already` : `${others} change less`
  }.`;
}

function whereHalved(bands: readonly BandEstimate[], halving: readonly BandEstimate[]): string {
  const [first, last] = [halving[0], halving[halving.length - 1]];
  if (first === last) return `At ${bandName(first.centreHz)}`;
  if (first === bands[0]) return `Up to ${bandName(last.centreHz)}`;
  if (last === bands[bands.length - 1]) return `From ${bandName(first.centreHz)} up`;
  return `From ${bandName(first.centreHz)} to ${bandName(last.centreHz)}`;
}

const directions = ['length', 'width', 'height'] as const;
const times = (count: number) => (count === 2 ? 'twice' : count === 3 ? 'three times' : `${count} times`);

/** "length", "length, twice", "length × width", "length twice × width". */
export function alongWords({ order, kind }: RoomMode): string {
  const parts = order.flatMap((halfWaves, i) =>
    halfWaves === 0
      ? []
      : [
          halfWaves === 1
            ? directions[i]
            : `${directions[i]}${kind === 'axial' ? ',' : ''} ${times(halfWaves)}`,
        ],
  );
  return parts.join(' × ');
}

const countWords = ['', '', 'two', 'three', 'four', 'five', 'six'];

/** "64.4 and 66.0 Hz: two close together, a boom". */
export function groupWords(group: readonly RoomMode[]): string {
  const hz = group.map(({ frequencyHz }) => number(frequencyHz, 1));
  const different = [...new Set(hz)];
  const listed =
    different.length > 1
      ? `${different.slice(0, -1).join(', ')} and ${different[different.length - 1]} Hz`
      : `${hz[0]} Hz`;
  const count = countWords[group.length] ?? String(group.length);
  return `${listed}: ${count} close together, a boom`;
}

const walls: Record<WallOnPlan, string> = {
  left: 'the left wall',
  right: 'the right wall',
  front: 'the front wall',
  back: 'the back wall',
};

function distanceWords(metres: number, unit: LengthUnit): string {
  if (unit === 'foot') return `${number(metres * feetInAMetre, 0)} ft`;
  if (metres === 0.25) return 'a quarter of a metre';
  if (metres === 0.5) return 'half a metre';
  return metres === 1 ? 'a metre' : `${short2(metres)} m`;
}
const short2 = (value: number) => String(Number(value.toFixed(2)));

/** What the chosen mode means for the kit; null: the kit is on no plan. */
export function kitSentence(mode: RoomMode, hint: KitHint | null, unit: LengthUnit): string {
  const hz = `${hertz(Number(mode.frequencyHz.toFixed(0)))} Hz`;
  if (!hint) return `At ${hz}: put the kit on the room’s plan, and this says how it stands.`;
  const { stand, move } = hint;
  if (stand === 'same-everywhere')
    return `${hz} stands between floor and ceiling: it is the same wherever the kit stands.`;
  if (stand === 'some') return `At ${hz} the kit stands between strong and none: a fair place.`;
  const where =
    stand === 'none'
      ? 'the kit stands where the room gives nothing'
      : 'the kit stands where the room booms most';
  const what = move
    ? `try ${distanceWords(move.distanceM, unit)} toward ${walls[move.toward]}`
    : 'moving it a little changes nothing';
  return `At ${hz} ${where}; ${what}.`;
}

const measureNames: Record<MissingMeasure, string> = {
  length: 'length',
  width: 'width',
  height: 'height',
  volume: 'volume',
  surface: 'surface',
};

/** "its length and height". */
export function missingWords(missing: readonly MissingMeasure[]): string {
  const names = missing.map((each) => measureNames[each]);
  return names.length > 1
    ? `its ${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`
    : `its ${names[0]}`;
}

/** "Take 8’s snare dies in 0.38 s at 1 kHz; the estimate says 0.45. They aren’t the same thing …" */
export function measuredWords(points: RoomTrendResponse['points'], estimateS: number | null): string {
  const newest = points[points.length - 1];
  const different = 'one is a room filled evenly, one is your snare at your overhead.';
  if (!newest)
    return `No take of this room tells its tail at 1 kHz yet: record eight hard snare hits, two seconds apart. It won’t be the same figure: ${different}`;
  return `Take ${newest.number}’s snare dies in ${tailText(newest.value)} s at 1 kHz; the estimate says ${tailText(estimateS)}. They aren’t the same thing: ${different}`;
}
