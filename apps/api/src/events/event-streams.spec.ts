import { Logger } from '@nestjs/common';
import { DatabaseNotices } from './database-notices';
import { EventStream } from './event-stream';
import { EventStreams, mostStreamsOfSession } from './event-streams';
import { MeasurementStates } from './measurement-states';

const streamOf = (sessionId: string) => {
  const [end, beat] = [jest.fn(), jest.fn()];
  const stream = { viewer: { userId: 'juno', sessionId }, takeIds: new Set(), end, beat };
  return { stream: stream as unknown as EventStream, end, beat };
};

describe('the open streams', () => {
  const liveAmong = jest.fn((ids: string[]) => Promise.resolve(new Set(ids)));
  const check = jest.fn(() => Promise.resolve());
  let streams: EventStreams;

  beforeEach(() => {
    liveAmong.mockClear();
    check.mockClear();
    const states = { of: () => Promise.resolve([]) } as unknown as MeasurementStates;
    streams = new EventStreams({ check } as unknown as DatabaseNotices, states, { liveAmong } as never);
  });

  const added = async (sessionId: string) => {
    const { stream, ...calls } = streamOf(sessionId);
    await streams.add(stream);
    return calls;
  };

  it('of a session that is over are ended and forgotten', async () => {
    const [over, open] = [await added('over'), await added('open')];
    liveAmong.mockResolvedValueOnce(new Set(['open']));
    await streams.beat();
    await streams.beat();
    expect(liveAmong.mock.calls).toEqual([[['over', 'open']], [['open']]]);
    expect(over.end).toHaveBeenCalledTimes(1);
    expect(open.beat).toHaveBeenCalledTimes(2);
  });

  it('beat on when it can’t be told whose session is over', async () => {
    const stream = await added('open');
    const warned = jest.spyOn(Logger.prototype, 'warn').mockReturnValue(undefined);
    liveAmong.mockRejectedValueOnce(new Error('The database went away.'));
    await streams.beat();
    expect(stream.end).not.toHaveBeenCalled();
    expect(stream.beat).toHaveBeenCalledTimes(1);
    expect(warned).toHaveBeenCalledTimes(1);
    warned.mockRestore();
  });

  it('are asked about once when two beats come at the same moment', async () => {
    await added('open');
    await Promise.all([streams.beat(), streams.beat()]);
    expect(liveAmong).toHaveBeenCalledTimes(1);
    expect(check).toHaveBeenCalledTimes(1);
  });

  it('are at most so many of one session: the oldest ends', async () => {
    const other = await added('other');
    const first = await added('open');
    const next = await added('open');
    for (let i = 2; i <= mostStreamsOfSession; i++) await added('open');
    expect(first.end).toHaveBeenCalledTimes(1);
    expect(next.end).not.toHaveBeenCalled();
    expect(other.end).not.toHaveBeenCalled();
  });
});
