import { emptySetup } from '@thudline/contracts';
import {
  agreementWords,
  apartWords,
  measuredWords,
  missingWords,
  numbersWords,
  placesWords,
  takesWords,
  usedWords,
} from './setupWords';

const metric = { lengthUnit: 'metre', temperatureC: 20 } as const;
const imperial = { lengthUnit: 'foot', temperatureC: 20 } as const;
const fields = {
  kick: { ...emptySetup.kick, insideCm: 8, offCentreCm: 4, heightCm: 28 },
  overhead: { ...emptySetup.overhead, aboveSnareCm: 90, towardKickCm: 9, awayFromHatCm: 8 },
};
const measured = (arrivalMs: number) => ({ takeId: 'x', number: 17, arrivalMs, arrivalIqrMs: 0.05 });

describe('the tape beside the sound', () => {
  it('agrees within the difference of the two', () => {
    expect(agreementWords(fields, measured(2.7), metric)).toBe('The tape and the sound agree within 3 cm.');
    expect(agreementWords(fields, measured(2.7), imperial)).toBe('The tape and the sound agree within 1 in.');
    expect(agreementWords(fields, measured(2.788), metric)).toBe('The tape and the sound agree within 1 cm.');
    expect(apartWords(fields, measured(2.7), metric)).toBe('');
  });

  it('is told apart, with what may be the reason, where it is further off than either can be', () => {
    expect(agreementWords(fields, measured(1.5), metric)).toBe('The tape and the sound are 44 cm apart.');
    expect(apartWords(fields, measured(1.5), metric)).toMatch(/^A microphone was moved/);
  });

  it('follows the temperature', () => {
    expect(agreementWords(fields, measured(2.8), { ...metric, temperatureC: 5 })).toBe(
      'The tape and the sound agree within 2 cm.',
    );
  });

  it('says what is missing', () => {
    expect(agreementWords(fields, null, metric)).toBe('No take has been measured with it yet.');
    expect(agreementWords(emptySetup, measured(2.7), metric)).toBe(
      'Take 17 is measured; the tape isn’t yet.',
    );
    expect(agreementWords(emptySetup, null, metric)).toBe('Write down what you measured with a tape.');
    expect(missingWords(fields)).toBe('');
    expect(missingWords({ ...fields, kick: { ...fields.kick, heightCm: null } })).toBe(
      'For the distance, still empty: height.',
    );
  });

  it('names both as distance and as time', () => {
    expect(measuredWords(measured(2.7), metric)).toBe('take 17 measured 93 cm, 2.7 ms');
    expect(numbersWords(95.68, metric)).toBe('the numbers say 96 cm, 2.8 ms');
    expect(numbersWords(95.68, imperial)).toBe('the numbers say 38 in, 2.8 ms');
  });
});

describe('a setup in words', () => {
  it('names the takes that have it', () => {
    const takes = [17, 16, 12, 9, 3].map((number) => ({ id: String(number), number }));
    expect(usedWords({ takes: [], takeCount: 0 })).toBe('no take has it yet');
    expect(usedWords({ takes: takes.slice(0, 1), takeCount: 1 })).toBe('used by take 17');
    expect(usedWords({ takes, takeCount: 9 })).toBe('used by takes 12, 16, 17 and 6 more');
    expect(takesWords(0)).toBe('no take yet');
    expect(takesWords(2)).toBe('2 takes');
  });

  it('names the places that are known', () => {
    const item = { ...fields, id: 'x', name: 'x', createdAt: '', takeCount: 0, lastUsedAt: null };
    expect(placesWords(item, metric)).toBe('kick 8 cm inside, overhead 90 cm above the snare');
    expect(placesWords({ ...item, kick: { ...item.kick, insideCm: -5 } }, metric)).toBe(
      'kick 5 cm in front of the hole, overhead 90 cm above the snare',
    );
    expect(placesWords({ ...item, kick: { ...item.kick, insideCm: 0 } }, metric)).toMatch(
      /^kick in the hole,/,
    );
    expect(placesWords({ ...item, ...emptySetup }, metric)).toBe('no places written down');
  });
});
