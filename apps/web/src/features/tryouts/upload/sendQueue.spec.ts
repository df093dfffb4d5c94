import type { CreateTakeRequest } from '@thudline/contracts';
import { fakeUploads } from '../../../testing/fakeXhr';
import { sampleTake } from '../../../testing/sampleData';
import { SendQueue, type PairToSend } from './sendQueue';
import { sendingWords } from './sendingWords';

const pair = (index: number): PairToSend => ({
  files: [new File(['12345'], `k${index}.wav`), new File(['12345'], `o${index}.wav`)],
  request: {
    uploadKey: `01890000-0000-4000-8000-00000000000${index}`,
    title: '',
    note: '',
    doneActions: [],
    tags: [],
    tracks: [],
  } satisfies CreateTakeRequest,
});

function started(count: number) {
  const uploads = fakeUploads();
  const queue = new SendQueue();
  const sent: string[] = [];
  queue.start({
    tryOutId: 't',
    pairs: Array.from({ length: count }, (_, i) => pair(i)),
    onSent: ({ id }) => sent.push(id),
  });
  const states = () => queue.snapshot()?.jobs.map(({ state }) => state);
  return { uploads, queue, sent, states };
}

describe('sending many pairs', () => {
  it('sends two at a time, in order, and tells of each that arrives', async () => {
    const { uploads, sent, states } = started(3);
    expect(states()).toEqual(['sending', 'sending', 'waiting']);
    await uploads[0].answer(201, sampleTake());
    expect(states()).toEqual(['sent', 'sending', 'sending']);
    expect(sent).toEqual([sampleTake().id]);
    expect(uploads).toHaveLength(3);
    expect(uploads[2].form?.get('uploadKey')).toBe(pair(2).request.uploadKey);
  });

  it('adds up bytes and takes', async () => {
    const { uploads, queue } = started(2);
    await uploads[0].answer(201, sampleTake());
    await uploads[1].progress(5, 900);
    expect(sendingWords(queue.snapshot()!)).toMatchObject({
      takes: '1 of 2 takes sent',
      share: 0.75,
      isOver: false,
    });
  });

  it('goes on after one that failed, and tries it again with the same key', async () => {
    const { uploads, queue, states } = started(2);
    await uploads[0].loseConnection();
    await uploads[1].answer(422, { code: 'wav-refused', message: 'k1.wav is an MP3 file.' });
    expect(states()).toEqual(['failed', 'failed']);
    expect(sendingWords(queue.snapshot()!)).toMatchObject({
      isOver: true,
      failed: [
        { name: 'k0.wav and o0.wav', message: 'The connection was lost.' },
        { name: 'k1.wav and o1.wav', message: 'k1.wav is an MP3 file.' },
      ],
    });
    queue.again();
    expect(states()).toEqual(['sending', 'sending']);
    expect(uploads[2].form?.get('uploadKey')).toBe(uploads[0].form?.get('uploadKey'));
  });

  it('stops everything when another try-out is sent', () => {
    const { uploads, queue } = started(2);
    queue.start({ tryOutId: 'other', pairs: [pair(7)], onSent: () => undefined });
    expect(uploads.slice(0, 2).every(({ aborted }) => aborted)).toBe(true);
    expect(queue.snapshot()?.jobs).toHaveLength(1);
  });
});
