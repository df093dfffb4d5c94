import type { UserSettings } from '@thudline/contracts';
import { number, temperature } from '../../lib/format';
import type { KnownRoom } from './knownRoom';
import { layerOf, type TreatmentPlan } from './treatmentPlan';
import { getMaterial } from './treatments';

/** What the estimate takes for granted, a sentence each. */
export function assumptions(
  room: KnownRoom,
  plan: TreatmentPlan,
  { schroederHz, settings }: { schroederHz: number | null; settings: Pick<UserSettings, 'temperatureUnit'> },
): string[] {
  const sources = [
    ...new Set([
      ...room.surfaces.map(({ materialId }) => shortSource(getMaterial(materialId).source)),
      shortSource(getMaterial(layerOf(plan).materialId).source),
    ]),
  ].filter((source) => source !== null);
  return [
    room.size
      ? 'A box with hard walls, sound spread evenly.'
      : 'Sound spread evenly; of the shape nothing is known.',
    `Coefficients from handbook tables (${sources.join('; ')}), counted as 1 at most. Shelves, the kit and you aren’t in it.`,
    guessWords(room),
    room.temperatureGuessed &&
      `${temperature(room.temperatureC, settings.temperatureUnit)}, because none is written down.`,
    schroederHz !== null &&
      `Below about ${number(Math.round(schroederHz / 10) * 10, 0)} Hz single modes rule, and a reverberation time says little.`,
  ].filter((sentence) => sentence !== false && sentence !== null);
}

/** "Bies, Hansen & Howard, 5th ed., Table 6.2". */
function shortSource(source: string): string | null {
  if (source.startsWith('Bies')) return 'Bies, Hansen and Howard, 5th ed., table 6.2';
  if (source.startsWith('Barron')) return 'Barron, appendix D';
  return null;
}

function guessWords({ size, surfaces }: KnownRoom): string | null {
  const guessed = surfaces.filter((surface) => surface.guessed);
  if (guessed.length === 0) return null;
  if (!size || guessed.length === 6)
    return 'Nobody wrote down what its surfaces are: plaster or brick is taken, so now may look too long.';
  const walls = guessed.filter(({ place }) => place !== 'floor' && place !== 'ceiling');
  const names = [
    ...(walls.length === 4 ? ['the walls'] : walls.map(({ place }) => `the ${place} wall`)),
    ...guessed.flatMap(({ place }) => (place === 'floor' || place === 'ceiling' ? [`the ${place}`] : [])),
  ];
  const listed =
    names.length > 1 ? `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}` : names[0];
  return `Nobody wrote down what ${listed} ${names.length > 1 || walls.length > 1 ? 'are' : 'is'}: plaster or brick is taken, so now may look too long.`;
}
