import { PassThrough, Readable } from 'node:stream';
import { Response } from 'express';
import { sendUntilClosed } from './send-until-closed';

const answerTo = (method: string) =>
  Object.assign(new PassThrough(), { req: { method } }) as unknown as Response & PassThrough;
const endless = () => new Readable({ read: () => undefined });

describe('sendUntilClosed', () => {
  it('closes what it was given without reading it when only the headers are asked for', async () => {
    const source = endless();
    const answer = answerTo('HEAD');
    await sendUntilClosed(source, answer);
    expect(source.destroyed).toBe(true);
    expect(answer.writableEnded).toBe(true);
  });

  it('closes what it was given when the listener has gone away', async () => {
    const source = endless();
    const answer = answerTo('GET');
    const sent = sendUntilClosed(source, answer);
    answer.destroy();
    await sent;
    expect(source.destroyed).toBe(true);
  });

  it('closes what it was given when the listener was gone before the first byte', async () => {
    const source = endless();
    const answer = answerTo('GET');
    answer.destroy();
    await sendUntilClosed(source, answer).catch((error: unknown) => error);
    expect(source.destroyed).toBe(true);
  });
});
