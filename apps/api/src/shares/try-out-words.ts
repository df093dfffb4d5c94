import { TryOutRankingRow, TryOutResponse, TryOutSubject, TryOutUnit } from '@thudline/contracts';

const subjectWords: Record<Exclude<TryOutSubject, 'other'>, string> = {
  'overhead-height': 'how high the overhead hangs',
  'overhead-forward': 'how far the overhead hangs toward the kick',
  'kick-depth': 'how deep the kick microphone stands',
  'kick-angle': 'how far the kick microphone is turned away',
};

const unitWords: Record<TryOutUnit, string> = { cm: ' cm', degree: '°', dB: ' dB', label: '' };

/** "Try-out: how high the overhead hangs" */
export function tryOutTitle({ subject, differs }: Pick<TryOutResponse, 'subject' | 'differs'>): string {
  return `Try-out: ${subject === 'other' ? differs : subjectWords[subject]}`;
}

/** "100 cm is fullest."; empty where none is best. */
export function bestWords(
  { places, unit }: Pick<TryOutResponse, 'places' | 'unit'>,
  rows: readonly Pick<TryOutRankingRow, 'placeId' | 'standing' | 'word'>[],
): string {
  const best = rows.find(({ standing }) => standing === 'best');
  const place = places.find(({ id }) => id === best?.placeId);
  if (!best?.word || !place) return '';
  const name = place.label || (place.position === null ? '' : `${place.position}${unitWords[unit]}`);
  return `${name || `Take ${place.take?.number ?? ''}`} is ${best.word}.`;
}
