import { defaultUserSettings } from '@thudline/contracts';
import { openChange, sampleChange, sampleLog, sampleRoom } from '../../testing/sampleRooms';
import { offeredTakes, suggestedTakes } from './changeDraft';
import { headSentence } from './headSentence';
import { planLayout, planPlace } from './pictures/planLayout';
import { draftKit, draftOf, draftShape, kitFields, roomRequest } from './roomDraft';
import { changeWords, sizeWords } from './roomWords';

describe('the sentence a log opens with', () => {
  it('says what the newest two did, and where nothing can be measured', () => {
    const nothing = sampleChange({
      what: 'The rug.',
      did: { status: 'cannot-tell', strong: 'No clear change', rest: 'in decay.' },
    });
    expect(headSentence([sampleChange(), openChange, nothing, nothing])).toEqual([
      { strong: 'Moving blankets on the back wall:', rest: 'a snare dies 0.11 s sooner at 500 Hz.' },
      { strong: 'The rug:', rest: 'no change we can measure.' },
    ]);
  });

  it('leaves a second clause for further down', () => {
    const did = {
      status: 'good' as const,
      strong: 'A snare dies 0.35 s sooner at 500 Hz, and less of a snare hangs on after 50 ms.',
      rest: 'Sure: 7 hits before, 7 after.',
    };
    expect(headSentence([sampleChange({ did })])[0].rest).toBe('a snare dies 0.35 s sooner at 500 Hz.');
  });

  it('says what is missing', () => {
    expect(headSentence([])[0].strong).toBe('Nothing is written down yet.');
    expect(headSentence([openChange])[0].strong).toBe('Nothing can be compared yet.');
  });
});

describe('takes of a change', () => {
  const { takes } = sampleLog();
  const numbers = (some: { number: number }[]) => some.map(({ number }) => number);

  it('are offered nearest first on both sides of the day', () => {
    const offered = offeredTakes(takes, { happenedOn: '2026-11-25', before: null, after: null });
    expect([numbers(offered.before), numbers(offered.after)]).toEqual([
      [7, 1],
      [8, 9],
    ]);
  });

  it('are suggested as the server does: the last before and the first after', () => {
    expect(suggestedTakes(takes, '2026-11-25')).toEqual({ before: [takes[2].id], after: [takes[1].id] });
    expect(suggestedTakes(takes, '2026-01-01').before).toEqual([]);
  });

  it('stay on offer where they are chosen, on whichever side of the day', () => {
    const offered = offeredTakes(takes, { happenedOn: '2026-12-24', before: null, after: [takes[3].id] });
    expect(numbers(offered.after)).toEqual([1]);
  });
});

describe('what is written down of a room', () => {
  it.each([
    ['metre', 'celsius'],
    ['foot', 'fahrenheit'],
  ] as const)('comes back as it was in %s and %s', (lengthUnit, temperatureUnit) => {
    const units = { ...defaultUserSettings, lengthUnit, temperatureUnit };
    const room = sampleRoom({
      surfaces: [
        { place: 'floor', materialId: 'concrete-floor', areaM2: null },
        { place: 'left', materialId: 'timber-door', areaM2: 4.4 },
      ],
    });
    const request = roomRequest(draftOf(room, units), units)!;
    const whole = ({ areaM2, ...rest }: (typeof room.surfaces)[number]) => ({
      ...rest,
      areaM2: areaM2 === null ? null : Math.round(areaM2 * 100) / 100,
    });
    expect(request.surfaces.map(whole)).toEqual(room.surfaces);
    expect(request.temperatureC).toBeCloseTo(12, 1);
    expect(request.kit!.xM).toBeCloseTo(3, 2);
    expect(request.shape).toMatchObject({ kind: 'box' });
    if (request.shape.kind === 'box') expect(request.shape.lengthM).toBeCloseTo(5.2, 2);
  });

  it('is nothing where nothing is said, and refused where it is no number', () => {
    const draft = draftOf(null, defaultUserSettings);
    expect(roomRequest(draft, defaultUserSettings)).toEqual({
      name: '',
      shape: { kind: 'box', lengthM: null, widthM: null, heightM: null },
      surfaces: [],
      temperatureC: null,
      kit: null,
    });
    expect(roomRequest({ ...draft, width: 'three' }, defaultUserSettings)).toBeNull();
  });

  it('has its patches with their area, and none without one', () => {
    const draft = draftOf(null, defaultUserSettings);
    const patch = { place: 'left' as const, materialId: 'timber-door', area: '2,1' };
    const request = roomRequest(
      { ...draft, patches: [patch, { ...patch, area: ' ' }] },
      defaultUserSettings,
    )!;
    expect(request.surfaces).toEqual([{ place: 'left', materialId: 'timber-door', areaM2: 2.1 }]);
    expect(roomRequest({ ...draft, patches: [{ ...patch, area: 'two' }] }, defaultUserSettings)).toBeNull();
  });

  it('has a plan as soon as its length and width are typed, and a kit as soon as its place is', () => {
    const draft = draftOf(null, defaultUserSettings);
    expect(draftShape({ ...draft, length: '5' }, defaultUserSettings)).toBeNull();
    expect(draftShape({ ...draft, length: '5', width: '3' }, defaultUserSettings)).toMatchObject({
      lengthM: 5,
      widthM: 3,
    });
    expect(draftKit({ ...draft, kitX: '2' }, defaultUserSettings)).toBeNull();
    const feet = { ...defaultUserSettings, lengthUnit: 'foot' as const };
    const kit = draftKit({ ...draft, ...kitFields({ xM: 2, yM: 1 }, feet) }, feet)!;
    expect(kit.xM).toBeCloseTo(2, 2);
  });

  it('reads in the reader’s units', () => {
    expect(sizeWords({ kind: 'other', volumeM3: 38, surfaceM2: null }, 'metre')).toBe('38 m³');
    expect(sizeWords(sampleRoom().shape, 'foot')).toBe('17.1 × 10.2 × 7.9 ft');
  });
});

describe('the plan', () => {
  it('is to scale, with the front at the bottom', () => {
    const plan = planLayout(sampleRoom().shape, 288)!;
    expect((plan.widthPx - 6) / (plan.heightPx - 6)).toBeCloseTo(5.2 / 3.1, 6);
    expect(plan.at({ xM: 0, yM: 0 })).toEqual({ x: 3, y: plan.heightPx - 3 });
    expect(plan.at({ xM: 99, yM: 99 })).toEqual({ x: plan.widthPx - 3, y: 3 });
  });

  it('gives back the place under a finger, inside the room, to five centimetres', () => {
    const shape = sampleRoom().shape;
    const plan = planLayout(shape, 288)!;
    const at = (place: { xM: number; yM: number }) => planPlace(plan, shape, plan.at(place));
    expect(at({ xM: 3, yM: 1.6 })).toEqual({ xM: 3, yM: 1.6 });
    expect(planPlace(plan, shape, { x: -40, y: 9999 })).toEqual({ xM: 0, yM: 0 });
    expect(planPlace(plan, shape, { x: 9999, y: -40 })).toEqual({ xM: 5.2, yM: 3.1 });
  });

  it('is not drawn from half its measures', () => {
    expect(planLayout({ kind: 'box', lengthM: 5, widthM: null, heightM: null }, 288)).toBeNull();
    expect(planLayout({ kind: 'other', volumeM3: 38, surfaceM2: 70 }, 288)).toBeNull();
  });
});

it('a figure that surely changed is told with its word', () => {
  const [decay, noise] = sampleChange().figures;
  expect(changeWords(decay)).toBe('0.60 → 0.49 s, shorter');
  expect(changeWords(noise)).toBe('no clear change');
});
