import type { ArrivalReason, FileNotice, NoiseFloorReason, VerdictReason } from '../facts';
import { defaultTarget, type ReportFigures } from '../report/reportTypes';
import {
  agreementFigures,
  clippedTrack,
  flipFigures,
  hotTrack,
  lateFigures,
  lowTrack,
  reportOf,
  silentTrack,
  trackFigures,
} from '../testing/figures';
import { addingUpFinding } from './addingUpFinding';
import { arrivalFinding } from './arrivalFinding';
import { dcOffsetFindings } from './dcOffsetFindings';
import { filesFindings } from './filesFindings';
import { dropoutFindings } from './dropoutFindings';
import { findings } from './findings';
import { flattenedFindings } from './flattenedFindings';
import { humFindings } from './humFindings';
import { lateStartFindings } from './lateStartFindings';
import { levelFinding } from './levelFinding';
import { nextActions } from './nextActions';
import { noiseFinding } from './noiseFinding';
import { oversFindings } from './oversFindings';
import { reportLine } from './reportLine';

const reader = { lengthUnit: 'metre', target: defaultTarget } as const;
const kickLevel = (kick: ReportFigures['kick']) => levelFinding(reportOf({ kick }), 'kick');
const addingUp = (change: Parameters<typeof agreementFigures>[0]) =>
  addingUpFinding(reportOf({ agreement: agreementFigures(change) }));

describe('the level finding', () => {
  it('calls a hot take a keeper and says what to turn', () => {
    expect(kickLevel(hotTrack)).toMatchObject({
      topic: 'kick-level',
      status: 'watch',
      sentence:
        'Kick peaks at −2.7 dBFS, unclipped: this take is fine, but a harder hit would clip; turn the kick preamp down 6.5 dB.',
    });
  });

  it('says where a hot take passes full scale between its samples', () => {
    expect(kickLevel({ ...hotTrack, truePeakDbtp: 0.42 }).why).toContain('already reaches 0.4 dBTP.');
    expect(kickLevel({ ...hotTrack, truePeakDbtp: null }).why).not.toContain('dBTP');
    expect(kickLevel({ ...hotTrack, truePeakDbtp: -0.3 }).why).not.toContain('dBTP');
  });

  it('counts flattened hits, and places where no hit is near', () => {
    expect(kickLevel(clippedTrack)).toMatchObject({
      status: 'fix',
      sentence:
        'Two kick hits are flattened because the input overloaded; turn the kick preamp down at least 9 dB and play again.',
    });
    expect(levelFinding(reportOf({ kick: clippedTrack, hits: [] }), 'kick').sentence).toMatch(
      /^The kick is flattened in three places/,
    );
  });

  it('is good on target', () => {
    expect(kickLevel(trackFigures())).toMatchObject({ status: 'good' });
    expect(kickLevel(trackFigures()).sentence).toContain('a hit 8 dB harder still fits');
  });

  it('watches a low take below −18, and one whose noise would come up', () => {
    const overhead = levelFinding(reportOf({ overhead: lowTrack }), 'overhead');
    expect(overhead.status).toBe('watch');
    expect(overhead.sentence).toBe(
      'Overhead peaks at −21.0 dBFS; raising it 12 dB later lifts noise to −58, so turn the overhead preamp up 12 dB now.',
    );
    expect(overhead.next).toContain('Lower the headphones');
    expect(kickLevel(trackFigures({ loudestHitDbfs: -14, noiseFloorDbfs: -64 })).status).toBe('watch');
    expect(kickLevel(trackFigures({ loudestHitDbfs: -14, noiseFloorDbfs: -70 })).status).toBe('good');
  });

  it("can't tell without a hit", () => {
    expect(kickLevel(trackFigures({ loudestHitDbfs: null })).status).toBe('cannot-tell');
    expect(kickLevel(silentTrack).sentence).toContain('its file is silent');
  });
});

describe('the adding-up finding', () => {
  it('is a fix where flipping surely gains, and says it can be done on this take', () => {
    const flip = addingUpFinding(reportOf({ agreement: flipFigures }));
    expect(flip).toMatchObject({
      status: 'fix',
      sentence:
        'Flip the overhead: low end cancels in 8 of 8 hits, flipping returns 1.4 dB; do it on this take, no retake needed.',
    });
    expect(flip.next).toContain('monitors muted');
  });

  it('says so where a low cut on the overhead would turn the verdict round', () => {
    const cut = { flipGainMatchedDb: -1.5, verdict: 'keep' } as const;
    expect(addingUpFinding(reportOf({ agreement: { ...flipFigures, lowCut: cut } })).sentence).toContain(
      'without a low cut on the overhead',
    );
  });

  it('is good where the microphones add', () => {
    expect(addingUp({})).toMatchObject({
      status: 'good',
      sentence:
        'Keep the polarity: the microphones add below 150 Hz and flipping would cost 1.4 dB; leave switches and stands alone.',
    });
  });

  it('is a watch where unsure, and says why', () => {
    expect(addingUp({ sure: false, hitsUsed: 2, agreeingHits: 2 })).toMatchObject({ status: 'watch' });
    expect(addingUp({ sure: false, hitsUsed: 1 }).sentence).toContain('only one kick hit says so');
    expect(addingUp({ sure: false, flipGainMatchedDb: -0.7 }).sentence).toContain('that is little');
  });

  it('is good either way, unless a low band is at stake', () => {
    const either = { verdict: 'either-way', flipGainMatchedDb: 0.1, lowCorrelation: 0.01 } as const;
    expect(addingUp(either)).toMatchObject({ status: 'good' });
    const mixed = addingUp({ ...either, contraryBands: [{ centreHz: 79.43, flipGainDb: -3 }] });
    expect(mixed).toMatchObject({ status: 'watch' });
    expect(mixed.sentence).toBe(
      'Mixed: flipping changes the low end little but loses 3.0 dB at 80 Hz; compare by ear, then move the overhead slightly.',
    );
  });

  it('names a third-octave that goes the other way', () => {
    expect(addingUp({ contraryBands: [{ centreHz: 1258.925, flipGainDb: 2.4 }] }).why).toContain(
      'At 1.25 kHz a flip gains 2.4 dB.',
    );
  });

  it("can't tell where hits disagree, and asks for the take that would settle it", () => {
    const told = addingUp({
      verdict: 'cannot-tell',
      sure: false,
      reason: 'hits-disagree',
      hitsUsed: 7,
      agreeingHits: 4,
    });
    expect(told).toMatchObject({
      status: 'cannot-tell',
      sentence:
        'Can’t tell: only 4 of 7 kick hits agree, so either polarity could win; record eight hard kicks with nothing else.',
    });
  });

  it("can't tell where the files look like two passes", () => {
    const told = addingUp({ verdict: 'cannot-tell', sure: false, reason: 'hits-unlike', agreeingHits: 6 });
    expect(told).toMatchObject({
      status: 'cannot-tell',
      sentence:
        'Can’t tell: the two files fit together differently at every kick, as two takes would; record eight hard kicks with nothing else.',
      next: 'See that both files are of one take. If they are, record eight hard kicks with nothing else.',
    });
  });
});

describe('the finding of a late start', () => {
  const said = (overheadLateMs: number) =>
    lateStartFindings(reportOf({ lateStart: { overheadLateMs, likeness: 0.7 } }));

  it('is a fix, and says which way to move the file', () => {
    expect(said(320.2)).toMatchObject([
      {
        topic: 'late-start',
        status: 'fix',
        sentence:
          'The overhead file runs 320 ms late against the kick file; play it 320 ms earlier, then export both from the same start.',
      },
    ]);
    expect(said(-45.4)[0].sentence).toContain('runs 45 ms early against the kick file; play it 45 ms later');
    expect(lateStartFindings(reportOf())).toEqual([]);
  });

  it('leaves arrival and polarity untold', () => {
    const told = findings(reportOf(lateFigures), reader).filter(({ status }) => status === 'cannot-tell');
    expect(told.map(({ topic, sentence }) => [topic, sentence])).toEqual([
      [
        'arrival',
        'Can’t tell how much later the overhead hears the kick: the files don’t start together; export both from the same start.',
      ],
      [
        'adding-up',
        'Can’t tell: the files don’t start together, and a few milliseconds turn a polarity over; export both from the same start.',
      ],
    ]);
  });
});

describe('the noise finding', () => {
  it('is of the noisier microphone, and a watch above −60', () => {
    const noisy = noiseFinding(reportOf({ overhead: trackFigures({ noiseFloorDbfs: -52 }) }));
    expect(noisy.status).toBe('watch');
    expect(noisy.sentence).toContain('overhead sits at −52 dBFS');
    expect(noiseFinding(reportOf()).status).toBe('good');
  });

  it('takes the one that can be told, and else says why not', () => {
    const none = trackFigures({ noiseFloorDbfs: null, noiseFloorReason: 'no-quiet-second' });
    expect(noiseFinding(reportOf({ overhead: none })).status).toBe('good');
    expect(noiseFinding(reportOf({ kick: none, overhead: none })).sentence).toContain(
      'leave three seconds silent',
    );
  });
});

describe('the arrival finding', () => {
  it('tells time and distance in the reader’s unit', () => {
    expect(arrivalFinding(reportOf(), reader).sentence).toContain('1.6 ms later, about 56 cm further away');
    expect(arrivalFinding(reportOf(), { lengthUnit: 'foot' }).sentence).toContain('about 1 ft 10 in further');
  });

  it('doubts what no placement explains, and what few hits show', () => {
    const arrival = (change: object) =>
      arrivalFinding(reportOf({ arrival: { ...reportOf().arrival, ...change } }), reader);
    expect(arrival({ arrivalMs: -8 }).sentence).toContain('8.0 ms earlier, which no placement explains');
    expect(arrival({ arrivalMs: 25 }).status).toBe('watch');
    expect(arrival({ confidence: 0.2, hitsUsed: 1 }).sentence).toContain(
      'but few hits show it; record eight kicks.',
    );
    expect(arrival({ confidence: 0.4, hitsUsed: 8 })).toMatchObject({
      status: 'watch',
      sentence:
        'The overhead seems to hear the kick 1.6 ms later, about 56 cm further away, but something may hide it; record eight kicks.',
    });
    expect(arrival({ arrivalMs: null, reason: 'hits-disagree' }).status).toBe('cannot-tell');
  });
});

describe('the offset finding', () => {
  it('is only there where there is something to say', () => {
    expect(dcOffsetFindings(reportOf())).toEqual([]);
    expect(dcOffsetFindings(reportOf({ kick: trackFigures({ dcOffset: 0.0005 }) }))).toEqual([]);
    const [found] = dcOffsetFindings(reportOf({ kick: trackFigures({ dcOffset: -0.01 }) }));
    expect(found.sentence).toContain('−40 dBFS');
  });
});

describe('the hum finding', () => {
  const humming = (levelDbfs: number) => trackFigures({ hum: { mainsHz: 60, levelDbfs } });

  it('is of the microphone that hums more, and keeps the safety earth', () => {
    const [hum] = humFindings(reportOf({ kick: humming(-64), overhead: humming(-58.4) }));
    expect(hum).toMatchObject({
      topic: 'hum',
      status: 'watch',
      sentence:
        'Mains hum sits at −58 dBFS in the overhead and rises with any gain; try another cable or outlet, and keep the safety earth.',
    });
    expect(hum.why).toContain('60 Hz');
    expect(hum.next).toContain('never lift a safety earth');
  });

  it('is only there where the hum may be heard', () => {
    expect(humFindings(reportOf())).toEqual([]);
    expect(humFindings(reportOf({ kick: humming(-70.1) }))).toEqual([]);
    expect(humFindings(reportOf({ kick: humming(-69.9) }))).toHaveLength(1);
  });

  it('asks for a search with the same caution, though the noise is low', () => {
    const [action] = nextActions(reportOf({ kick: humming(-64) }), reader);
    expect([action.id, action.action]).toEqual([
      'look-for-noise',
      'Look for the hum: try another cable or outlet.',
    ]);
    expect(action.detail).toContain('Keep the safety earth.');
    expect(reportLine(reportOf({ kick: humming(-64) }), reader)).toEqual([
      { action: 'Look for the hum:', reason: 'the mains sit at −64 dBFS in the kick.' },
    ]);
  });
});

describe('the findings about what happened to the wave', () => {
  it('are only there where there is something to say', () => {
    const old = trackFigures({ looksFlattened: null, dropouts: null });
    for (const kick of [trackFigures(), old, clippedTrack]) {
      const figures = reportOf({ kick });
      expect([dropoutFindings, flattenedFindings, oversFindings].flatMap((rule) => rule(figures))).toEqual(
        [],
      );
    }
  });

  it('tell where it seems to drop out', () => {
    const told = (count: number) =>
      dropoutFindings(reportOf({ kick: trackFigures({ dropouts: { count, firstAtS: 12.34 } }) }))[0];
    expect(told(3)).toMatchObject({ topic: 'dropouts', status: 'watch' });
    expect(told(3).sentence).toBe(
      'The kick seems to drop out in three places, the first at 12.3 s; raise the interface’s buffer size and record again.',
    );
    expect(told(1).sentence).toContain('in one place, at 12.3 s;');
  });

  it('tell of squashed peaks, but not where they are clipped anyway', () => {
    const squashed = { looksFlattened: true };
    expect(flattenedFindings(reportOf({ overhead: trackFigures(squashed) }))).toMatchObject([
      { topic: 'flattened', status: 'watch' },
    ]);
    expect(flattenedFindings(reportOf({ overhead: { ...clippedTrack, ...squashed } }))).toEqual([]);
  });

  it('tell of a float file beyond full scale that nothing is lost', () => {
    const [over] = oversFindings(reportOf({ kick: trackFigures({ samplePeakDbfs: 2.31 }) }));
    expect(over.sentence).toBe(
      'The kick goes 2.3 dB over full scale, unharmed in a float file; turn it down 2.3 dB before saving it as 24-bit.',
    );
    expect(oversFindings(reportOf({ kick: { ...clippedTrack, samplePeakDbfs: 2.31 } }))).toEqual([]);
  });
});

describe('all findings', () => {
  it('come in the order of the sheet and keep what was said of the files', () => {
    const files = filesFindings([{ kind: 'same-file-twice' }]);
    const topics = findings(reportOf({ findings: files }), reader).map((finding) => finding.topic);
    expect(topics).toEqual(['files', 'kick-level', 'overhead-level', 'noise', 'arrival', 'adding-up']);
  });
});

const noise: NoiseFloorReason[] = ['too-short', 'no-quiet-second', 'digital-silence'];
const arrivals: ArrivalReason[] = [
  'late-start',
  'no-kick-hits',
  'too-few-hits',
  'hits-disagree',
  'overhead-silent',
  'methods-disagree',
];
const verdicts: VerdictReason[] = [
  'late-start',
  'no-kick-hits',
  'hits-disagree',
  'hits-unlike',
  'arrival-spread',
  'bands-disagree',
  'overhead-silent',
];
const notices: FileNotice[] = [
  { kind: 'lengths-differ', byS: 1234.5 },
  { kind: 'lengths-differ', byS: 0.0001 },
  { kind: 'same-file-twice' },
  { kind: 'unrelated-files' },
  { kind: 'cut-short', role: 'overhead' },
  { kind: 'silent', role: 'overhead' },
];

/** Every rule in every branch, with figures that take as many words as they can. */
const everything = (): ReportFigures[] => {
  const tracks = [
    trackFigures(),
    clippedTrack,
    hotTrack,
    lowTrack,
    silentTrack,
    trackFigures({ loudestHitDbfs: null }),
    trackFigures({ loudestHitDbfs: -14, dcOffset: 0.2 }),
    trackFigures({ loudestHitDbfs: -14, noiseFloorDbfs: null, noiseFloorReason: 'too-short' }),
    trackFigures({ loudestHitDbfs: -42.4, noiseFloorDbfs: null }),
    trackFigures({ noiseFloorDbfs: -32 }),
    trackFigures({ looksFlattened: true, samplePeakDbfs: 12.4, dropouts: { count: 123, firstAtS: 3599.94 } }),
    trackFigures({ dropouts: { count: 1, firstAtS: 0 } }),
    trackFigures({ hum: { mainsHz: 50, levelDbfs: -12.3 } }),
    { ...clippedTrack, clipping: { runs: [], runCount: 12345, clippedSamples: 99999 } },
    ...noise.map((noiseFloorReason) => trackFigures({ noiseFloorDbfs: null, noiseFloorReason })),
  ];
  const contrary = [{ centreHz: 158.489, flipGainDb: -12.5 }];
  const many = { hitsUsed: 1234, agreeingHits: 1111, flipGainMatchedDb: 12.5 };
  const cut = { flipGainMatchedDb: -11.5, verdict: 'either-way' } as const;
  const agreements = [
    ...(['flip', 'keep', 'either-way'] as const).flatMap((verdict) =>
      [true, false].flatMap((sure) => [
        agreementFigures({ ...many, verdict, sure }),
        agreementFigures({ ...many, verdict, sure, lowCut: cut, contraryBands: contrary }),
        agreementFigures({ ...many, verdict, sure, hitsUsed: 2, agreeingHits: 2, lowCorrelation: 0 }),
        agreementFigures({
          ...many,
          verdict,
          sure,
          bands: [-1, 1, 2].map((flipGainDb) => ({ lowHz: 30, highHz: 150, flipGainDb })),
        }),
      ]),
    ),
    ...verdicts.map((reason) => agreementFigures({ ...many, verdict: 'cannot-tell', sure: false, reason })),
  ];
  const base = reportOf().arrival;
  const arrivalReports = [
    ...[-125.5, -0.2, 1.6, 125.5].flatMap((arrivalMs) => [
      { ...base, arrivalMs, pathDifferenceM: 10.65 },
      { ...base, arrivalMs, pathDifferenceM: 10.65, confidence: 0.1 },
    ]),
    ...arrivals.map((reason) => ({ ...base, arrivalMs: null, pathDifferenceM: null, reason })),
  ];
  return [
    ...tracks.flatMap((track) => [reportOf({ kick: track, overhead: track })]),
    ...agreements.map((agreement) => reportOf({ agreement })),
    ...arrivalReports.map((arrival) => reportOf({ arrival })),
    reportOf({ findings: filesFindings(notices) }),
    ...[1499.9, -1499.9].map((overheadLateMs) =>
      reportOf({ ...lateFigures, lateStart: { overheadLateMs, likeness: 0.6 } }),
    ),
  ];
};

describe('every sentence', () => {
  const told = everything().flatMap((figures) => findings(figures, { ...reader, lengthUnit: 'foot' }));

  it('has at most 25 words', () => {
    const long = told.filter((finding) => finding.sentence.split(/\s+/).length > 25);
    expect(long.map((finding) => finding.sentence)).toEqual([]);
  });

  it('is calm, whole, and has a reason and a next step', () => {
    for (const { sentence, why, next } of told) {
      for (const text of [sentence, why, next]) {
        expect(text).toMatch(/^[A-Z].*\.$/);
        expect(text).not.toMatch(/!|NaN|undefined|null|Infinity|-\d|  /);
      }
    }
  });

  it('carries every status, and clipping is always a fix', () => {
    expect(new Set(told.map((finding) => finding.status))).toEqual(
      new Set(['good', 'watch', 'fix', 'cannot-tell']),
    );
    const flattened = told.filter((finding) => finding.sentence.includes('flattened'));
    expect(new Set(flattened.map((finding) => finding.status))).toEqual(new Set(['fix']));
  });
});
