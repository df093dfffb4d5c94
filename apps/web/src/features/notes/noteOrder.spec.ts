import type { NotePin } from '@thudline/contracts';
import { noteId, sampleThread } from '../../testing/sampleNotes';
import { letteredThreads, sectionOf } from './noteOrder';

const pinned = (number: number, pin: NotePin) => sampleThread({ id: noteId(number), pin });
const everywhere = () => true;

describe('notes on a sheet', () => {
  it.each<[NotePin, string | null]>([
    [{ kind: 'take' }, null],
    [{ kind: 'time', timeS: 3 }, 'whole-take'],
    [{ kind: 'hit', timeS: 3 }, 'levels'],
    [{ kind: 'finding', topic: 'hum' }, 'levels'],
    [{ kind: 'finding', topic: 'arrival' }, 'adding-up'],
    [{ kind: 'finding', topic: 'files' }, 'top'],
  ])('stand where what they speak of is: %j', (pin, section) => {
    expect(sectionOf(pin)).toBe(section);
  });

  it('are lettered from the top of the sheet down, whenever they were written', () => {
    const threads = [
      pinned(1, { kind: 'time', timeS: 9 }),
      pinned(2, { kind: 'finding', topic: 'adding-up' }),
      pinned(3, { kind: 'take' }),
      pinned(4, { kind: 'time', timeS: 2 }),
      pinned(5, { kind: 'hit', timeS: 4.3 }),
    ];
    const found = letteredThreads(threads, everywhere).map(({ thread, letter }) => [letter, thread.id]);
    expect(found).toEqual([
      ['a', noteId(5)],
      ['b', noteId(2)],
      ['c', noteId(4)],
      ['d', noteId(1)],
    ]);
  });

  it('speak of the take where the sheet has no such section', () => {
    const thread = pinned(1, { kind: 'finding', topic: 'room' });
    expect(letteredThreads([thread], (section) => section !== 'room')).toEqual([]);
  });

  it('go on with two letters after z', () => {
    const threads = Array.from({ length: 28 }, (_, i) => pinned(i, { kind: 'time', timeS: i }));
    const letters = letteredThreads(threads, everywhere).map(({ letter }) => letter);
    expect(letters.slice(-3)).toEqual(['z', 'aa', 'ab']);
  });
});
