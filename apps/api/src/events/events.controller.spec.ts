import { EventEmitter } from 'node:events';
import { Response } from 'express';
import { EventsController } from './events.controller';

it('a tab that closed while its takes were looked up is not listed as listening', async () => {
  const streams = { add: jest.fn(), remove: jest.fn() };
  const access = { ownAmong: () => Promise.resolve([]) };
  const response = Object.assign(new EventEmitter(), { destroyed: true }) as unknown as Response;
  const viewer = { user: { id: 'juno' }, sessionId: 'session', readOnly: false };
  await new EventsController(streams as never, access as never).listen(
    viewer as never,
    { takes: [] },
    response,
  );
  expect(streams.add).not.toHaveBeenCalled();
});
