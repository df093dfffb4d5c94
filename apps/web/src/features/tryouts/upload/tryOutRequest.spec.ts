import { createTakeRequest, createTryOutRequest } from '@thudline/contracts';
import { samplePlace, sampleTryOut } from '../../../testing/sampleTryOut';
import type { PickedFile } from '../../upload/pickedFile';
import { draftReducer, emptyDraft, positionText, type DraftAction, type TryOutDraft } from './tryOutDraft';
import { draftProblem, tryOutPlan } from './tryOutRequest';
import { pairsToSendAgain } from './unsentPairs';

const nowMs = Date.UTC(2026, 11, 1);
const file = (name: string) => new File(['x'], name, { lastModified: nowMs - 60_000 });
const ready = (sampleRateHz = 48_000, channels = 1): PickedFile['reading'] =>
  ({ kind: 'ready', facts: { channels, sampleRateHz }, lowEndRatios: [0.5, 0.1] }) as PickedFile['reading'];

const after = (actions: readonly DraftAction[], start: TryOutDraft = emptyDraft()) =>
  actions.reduce(draftReducer, start);
const dropped = (...names: string[]): DraftAction[] => [
  { type: 'added', files: names.map((name) => ({ id: name, file: file(name) })) },
  ...names.map((id): DraftAction => ({ type: 'read', id, reading: ready() })),
];
const four = after(dropped('kick 90cm.wav', 'oh 90cm.wav', 'kick 100cm.wav', 'oh 100cm.wav'));
const keys = () => {
  let count = 0;
  return () => `01890000-0000-4000-8000-00000000000${++count}`;
};
const plan = (draft: TryOutDraft, lengthUnit: 'metre' | 'foot' = 'metre') =>
  tryOutPlan(draft, { lengthUnit, newKey: keys(), nowMs });

describe('a try-out of many files', () => {
  it('asks for places with the keys the takes will be sent with', () => {
    const { body, pairs } = plan({ ...four, currentKey: four.pairs[1].key });
    expect(createTryOutRequest.parse(body)).toMatchObject({
      subject: 'overhead-height',
      unit: 'cm',
      currentIndex: 1,
      places: [
        { position: 90, fileNames: ['kick 90cm.wav', 'oh 90cm.wav'] },
        { position: 100, fileNames: ['kick 100cm.wav', 'oh 100cm.wav'] },
      ],
    });
    expect(pairs.map(({ request }) => request.uploadKey)).toEqual(
      body.places.map(({ uploadKey }) => uploadKey),
    );
    expect(createTakeRequest.parse(pairs[0].request)).toMatchObject({
      title: 'Overhead at 90 cm',
      tracks: [
        { role: 'kick', fileIndex: 0 },
        { role: 'overhead', fileIndex: 1 },
      ],
    });
  });

  it('reads written inches as centimetres, and a comma as a point', () => {
    const [first] = four.pairs;
    const written = after([{ type: 'positionWritten', key: first.key, text: '10' }], four);
    expect(plan(written, 'foot').body.places[0].position).toBeCloseTo(25.4, 9);
    expect(positionText(four, first, 'foot')).toBe('35.4');
    const comma = after([{ type: 'positionWritten', key: first.key, text: '87,5' }], four);
    expect(plan(comma).body.places[0].position).toBe(87.5);
  });

  it('keeps labels where what differs has no number', () => {
    const beaters = after(
      [
        { type: 'subjectChosen', subject: 'other' },
        { type: 'differsWritten', text: 'the beater' },
        { type: 'positionWritten', key: four.pairs[0].key, text: 'felt' },
      ],
      four,
    );
    const { body, pairs } = plan(beaters);
    expect(body).toMatchObject({
      differs: 'the beater',
      unit: 'label',
      places: [{ label: 'felt', position: null }, {}],
    });
    expect(pairs[0].request.title).toBe('felt');
  });

  it('says what is missing before anything is made', () => {
    expect(draftProblem(emptyDraft(), 'metre')).toMatch(/at least two takes/);
    expect(draftProblem(after(dropped('kick 1.wav', 'oh 1.wav', 'kick 2.wav')), 'metre')).toBe(
      'Pair 2: its overhead file is missing.',
    );
    const high = after([{ type: 'positionWritten', key: four.pairs[1].key, text: 'high' }], four);
    expect(draftProblem(high, 'metre')).toBe('Write the position of take 2 as a number.');
    expect(draftProblem(after([{ type: 'subjectChosen', subject: 'other' }], four), 'metre')).toMatch(
      /what differs/,
    );
    expect(draftProblem(four, 'metre')).toBe('');
    const rates = after([{ type: 'read', id: 'oh 90cm.wav', reading: ready(44_100) }], four);
    expect(draftProblem(rates, 'metre')).toMatch(/^Pair 1: these two have different sample rates/);
  });

  it('leaves what was put right alone when more files come', () => {
    const right = after([{ type: 'swapped', key: four.pairs[0].key }], four);
    const more = after(dropped('kick 110cm.wav', 'oh 110cm.wav'), right);
    expect(more.pairs).toHaveLength(3);
    expect(more.pairs[0].kick?.fileId).toBe('oh 90cm.wav');
  });
});

describe('files that are dropped again', () => {
  const place = samplePlace(1, { take: null, fileNames: ['k.wav', 'o.wav'] });
  const tryOut = sampleTryOut({ places: [samplePlace(0), place] });
  const picked = (name: string): PickedFile => ({ id: name, file: file(name), reading: ready() });
  const again = (...names: string[]) =>
    pairsToSendAgain(tryOut, names.map(picked), { lengthUnit: 'metre', nowMs });

  it('travel with the keys of the first time', () => {
    const { pairs, strangers } = again('o.wav', 'k.wav', 'else.wav');
    expect(pairs).toHaveLength(1);
    expect(pairs[0].request).toMatchObject({ uploadKey: place.uploadKey, title: 'Overhead at 90 cm' });
    expect(pairs[0].files.map(({ name }) => name)).toEqual(['k.wav', 'o.wav']);
    expect(strangers).toEqual(['else.wav']);
  });

  it('wait for their other half', () => {
    expect(again('k.wav').pairs).toEqual([]);
  });
});
