import { TryOutPlaceResponse } from '@thudline/contracts';
import { bestWords, tryOutTitle } from './try-out-words';

const place = (id: string, changed: Partial<TryOutPlaceResponse>) =>
  ({ id, label: '', position: null, take: { number: 7 }, ...changed }) as TryOutPlaceResponse;
const rows = [
  { placeId: 'a', standing: 'worse', word: 'clearly thinner' },
  { placeId: 'b', standing: 'best', word: 'fullest' },
] as const;

describe('a try-out in a preview', () => {
  it('is titled by what differs', () => {
    expect(tryOutTitle({ subject: 'kick-depth', differs: '' })).toBe(
      'Try-out: how deep the kick microphone stands',
    );
    expect(tryOutTitle({ subject: 'other', differs: 'the beater' })).toBe('Try-out: the beater');
  });

  it('says which is best: by its position, its label, or its take', () => {
    expect(bestWords({ places: [place('b', { position: 100 })], unit: 'cm' }, rows)).toBe(
      '100 cm is fullest.',
    );
    expect(bestWords({ places: [place('b', { position: 12 })], unit: 'degree' }, rows)).toBe(
      '12° is fullest.',
    );
    expect(bestWords({ places: [place('b', { label: 'Felt' })], unit: 'label' }, rows)).toBe(
      'Felt is fullest.',
    );
    expect(bestWords({ places: [place('b', {})], unit: 'cm' }, rows)).toBe('Take 7 is fullest.');
  });

  it('says nothing where none is best', () => {
    expect(bestWords({ places: [place('a', {})], unit: 'cm' }, rows.slice(0, 1))).toBe('');
  });
});
