import type {
  TryOutPlaceResponse,
  TryOutRankingResponse,
  TryOutRankingRow,
  TryOutResponse,
} from '@thudline/contracts';
import { plural } from '../../lib/format';
import { rankingWords, sizeWords, valueWords } from './measureWords';
import { positionWords, shortPosition, type LengthUnit } from './positionWords';
import { subjectWords } from './subjectWords';

export interface HeadlineWords {
  strong: string;
  rest: string;
}

interface Facts {
  tryOut: TryOutResponse;
  ranking: TryOutRankingResponse;
  lengthUnit: LengthUnit;
}

/** What to do, and why: the sentence the try-out opens with. */
export function headline(facts: Facts): HeadlineWords {
  const best = facts.ranking.rows.find(({ standing }) => standing === 'best');
  if (!best) return cannotTell(facts);
  const { tryOut, ranking } = facts;
  const words = subjectWords(tryOut);
  const bestPlace = placeOf(facts, best.placeId);
  const currentPlace = placeOf(facts, tryOut.currentPlaceId);
  const current = ranking.rows.find(({ placeId }) => placeId === currentPlace?.id);
  const named = (place: TryOutPlaceResponse | undefined) => nameOf(place, facts);
  if (!current?.rank || current.fromBest === null)
    return {
      strong: `${words.put} ${named(bestPlace)}:`,
      rest: sentence(
        `${best.word ?? 'best'}, ${valueWords(best.value ?? 0, ranking)}.`,
        asGood(facts, [best]),
      ),
    };
  if (current === best) {
    const others = asGood(facts, [best]);
    return {
      strong: `${words.stay} ${named(currentPlace)}:`,
      rest: sentence(`nothing else is ${rankingWords(ranking).than}.`, others),
    };
  }
  const size = sizeWords(current.fromBest, ranking);
  if (current.standing === 'as-good')
    return {
      strong: `${words.stay} ${named(currentPlace)}:`,
      rest: `${shortNameOf(bestPlace, facts)} reads ${size} ${rankingWords(ranking).than}, which may be chance.`,
    };
  return {
    strong: `${wayWords(facts, currentPlace, bestPlace)} ${named(bestPlace)}:`,
    rest: sentence(`${rankingWords(ranking).better(size)} than now.`, asGood(facts, [best])),
  };
}

const sentence = (...parts: string[]) => parts.filter(Boolean).join(' ');

const placeOf = ({ tryOut }: Facts, placeId: string | null | undefined) =>
  tryOut.places.find(({ id }) => id === placeId);

const takeName = (place: TryOutPlaceResponse | undefined) => `take ${place?.take?.number ?? ''}`.trim();

const nameOf = (place: TryOutPlaceResponse | undefined, { tryOut, lengthUnit }: Facts): string =>
  (place && positionWords(place, tryOut.unit, lengthUnit)) ?? takeName(place);

const shortNameOf = (place: TryOutPlaceResponse | undefined, { tryOut, lengthUnit }: Facts): string =>
  (place && shortPosition(place, tryOut.unit, lengthUnit)) ?? takeName(place);

function wayWords(
  { tryOut }: Facts,
  from: TryOutPlaceResponse | undefined,
  to: TryOutPlaceResponse | undefined,
): string {
  const words = subjectWords(tryOut);
  if (from?.position == null || to?.position == null) return words.put;
  return to.position >= from.position ? words.more : words.less;
}

/** "110 may be as good." */
function asGood(facts: Facts, besides: readonly TryOutRankingRow[]): string {
  const names = facts.ranking.rows
    .filter((row) => row.standing === 'as-good' && !besides.includes(row))
    .map(({ placeId }) => shortNameOf(placeOf(facts, placeId), facts));
  if (names.length === 0) return '';
  if (names.length > 3) return `${names.length} others may be as good.`;
  return `${capital(listed(names))} may be as good.`;
}

const listed = (names: string[]) =>
  names.length === 1 ? names[0] : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`;

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** Why nothing can be ranked, and what would settle it. */
function cannotTell({ tryOut, ranking }: Facts): HeadlineWords {
  const waiting = tryOut.places.filter(
    ({ take }) => take && !take.hasReport && isWaiting(take.measurement.state),
  );
  if (ranking.rows.length === 0)
    return waiting.length > 0
      ? { strong: 'The takes are being measured.', rest: 'The ranking appears here by itself.' }
      : { strong: 'Nothing to rank yet.', rest: 'No take of this try-out has a sheet.' };
  const few = ranking.rows.filter(({ reason }) => reason === 'too-few-hits').length;
  if (few > 0)
    return {
      strong: 'Can’t tell which is best:',
      rest: `${plural(few, 'take')} ${few === 1 ? 'has' : 'have'} too few hits. Play at least six kicks and six other drums at each position.`,
    };
  const old = ranking.rows.some(({ reason }) => reason === 'not-measured');
  return {
    strong: 'Can’t tell which is best:',
    rest: old
      ? 'these takes were measured before hits were kept one by one. Measure them again.'
      : 'the hits differ too much in strength. Play each position alike.',
  };
}

const isWaiting = (state: string) => state === 'queued' || state === 'running';
