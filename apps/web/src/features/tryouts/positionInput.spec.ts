import { positionText, typedPosition } from './positionInput';

describe('writing where a take stood', () => {
  it('reads numbers in the reader’s unit, with a comma or a minus of any kind', () => {
    expect(typedPosition(' 90,5 ', 'cm', 'metre')).toEqual({ position: 90.5, label: '' });
    expect(typedPosition('10', 'cm', 'foot')).toEqual({ position: 25.4, label: '' });
    expect(typedPosition('−4', 'degree', 'foot')).toEqual({ position: -4, label: '' });
  });

  it('takes words for labels, nothing for nothing, and no words for a number', () => {
    expect(typedPosition('felt', 'label', 'metre')).toEqual({ position: null, label: 'felt' });
    expect(typedPosition('', 'cm', 'metre')).toEqual({ position: null, label: '' });
    expect(typedPosition('high', 'cm', 'metre')).toBeNull();
  });

  it('shows what is kept as it would be written', () => {
    expect(positionText({ position: 25.4, label: '' }, 'cm', 'foot')).toBe('10');
    expect(positionText({ position: 90.5, label: '' }, 'cm', 'metre')).toBe('90.5');
    expect(positionText({ position: null, label: 'felt' }, 'label', 'metre')).toBe('felt');
  });
});
