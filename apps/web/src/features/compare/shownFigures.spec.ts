import { sampleComparison } from '../../testing/sampleComparison';
import { shownFigures } from './shownFigures';

describe('the figures a comparison shows first', () => {
  const [figure] = sampleComparison().figures;

  it('are what it is about, and whatever changed clearly', () => {
    const figures = [
      { ...figure, key: 'low-end' as const, clear: false },
      { ...figure, key: 'decay-500' as const, clear: false },
      { ...figure, key: 'decay-1000' as const, clear: true },
      { ...figure, key: 'attack' as const, clear: false, change: null, reason: 'Too few hits.' },
    ];
    expect(shownFigures(figures).map(({ key }) => key)).toEqual(['low-end', 'decay-1000', 'attack']);
  });
});
