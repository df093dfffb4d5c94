import { doneActions } from './previousTake';

const action = (id: string) => ({ id, action: id, detail: '', leave: false });
const previous = {
  take: { id: 'a', number: 20, tickedActions: ['flip-overhead', 'gone-since'] },
  actions: [action('kick-gain'), action('flip-overhead')],
};

describe('what was changed since the take before', () => {
  it('starts with what was ticked on its sheet, as far as it still asks for it', () => {
    expect(doneActions(previous, null)).toEqual(['flip-overhead']);
  });

  it('is what was ticked here once something was', () => {
    expect(doneActions(previous, ['kick-gain'])).toEqual(['kick-gain']);
    expect(doneActions(previous, [])).toEqual([]);
  });
});
