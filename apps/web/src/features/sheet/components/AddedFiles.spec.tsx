import { ChakraProvider } from '@chakra-ui/react';
import { paths, type AddedFileResponse } from '@thudline/contracts';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { SWRConfig } from 'swr';
import { fakeServer, json, refusal, type FakeRoutes } from '../../../testing/fakeServer';
import { sampleReport, takeId } from '../../../testing/sampleData';
import { system } from '../../../theme/system';
import { useChoice } from '../hooks/useChoice';
import { AddedFiles } from './AddedFiles';

const id = '0199a000-0000-7000-8000-00000000ad01';
const choice = { flipped: true, shiftMs: 0, gainDb: 5.7 };
const done: AddedFileResponse = {
  id,
  createdAt: '2026-12-01T12:00:00.000Z',
  choice,
  state: 'done',
  progress: 1,
  reason: null,
  file: {
    name: 'take-14-added-flipped-5.7-dB-louder.wav',
    bytes: 2_304_000,
    sha256: 'cd'.repeat(32),
    durationS: 16,
    levelDb: -3.2,
    truePeakDbtp: -1,
    listenGainDb: -2.1,
  },
};
const running: AddedFileResponse = { ...done, state: 'running', progress: 0.4, file: null };
const list = `GET ${paths.addedFiles(takeId)}`;
const everything = { change: true, listen: true, download: true };

function Opened({ rights }: { rights: typeof everything }) {
  const bench = useChoice({ ...sampleReport().agreement, verdict: 'flip', matchGainDb: 5.7 });
  const listening = { playing: null, stop: () => undefined } as unknown as Parameters<
    typeof AddedFiles
  >[0]['listening'];
  return <AddedFiles take={{ id: takeId, rights }} bench={bench} listening={listening} />;
}

function open(routes: FakeRoutes, rights = everything) {
  const server = fakeServer(routes);
  render(
    <ChakraProvider value={system}>
      <SWRConfig value={{ provider: () => new Map(), shouldRetryOnError: false, dedupingInterval: 0 }}>
        <Opened rights={rights} />
      </SWRConfig>
    </ChakraProvider>,
  );
  return server;
}

const makeButton = () => screen.findByRole('button', { name: 'Make one file of the two' });

describe('one file of the two', () => {
  it('says that it is looking, and that it could not, with another try', async () => {
    let isDown = true;
    const answers: FakeRoutes = {
      [list]: () => (isDown ? refusal(500, 'internal', 'Something broke.')() : json({ items: [] })()),
    };
    open(answers);
    expect(screen.getByRole('status')).toHaveTextContent('Looking for files made earlier.');
    expect(await screen.findByRole('alert')).toHaveTextContent('could not be listed. Something broke.');
    isDown = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await makeButton()).toBeEnabled();
  });

  it('is made with the choice on the sheet, shows how far it is, and can be kept', async () => {
    const states = [[], [running], [done]];
    const server = open({
      [list]: () => json({ items: states.length > 1 ? states.shift() : states[0] })(),
      [`POST ${paths.addedFiles(takeId)}`]: json({ ...running, state: 'queued', progress: 0 }),
    });
    expect(await screen.findByText('Kick and overhead flipped, 5.7 dB louder.')).toBeInTheDocument();
    await userEvent.click(await makeButton());
    const progress = await screen.findByRole('progressbar', {
      name: 'Making one file: overhead flipped, 5.7 dB louder',
    });
    expect(progress).toHaveAttribute('aria-valuenow', '40');
    expect(server.requests).toContainEqual({ method: 'POST', path: paths.addedFiles(takeId), body: choice });
    const link = await screen.findByRole('link', { name: done.file!.name }, { timeout: 3000 });
    expect(link).toHaveAttribute('href', paths.addedFileDownload(takeId, id));
    const row = within(screen.getByRole('listitem'));
    expect(row.getByText(/24-bit WAV, 2.3 MB, turned down 3.2 dB/)).toBeInTheDocument();
    expect(row.getByText('heard 2.1 dB quieter, as loud as the two as recorded')).toBeInTheDocument();
    expect(await makeButton()).toBeDisabled();
  });

  it('tells why one failed and tries it again', async () => {
    const failed = { ...running, state: 'failed' as const, reason: 'Making this file failed on our side.' };
    const server = open({
      [list]: json({ items: [failed] }),
      [`POST ${paths.addedFiles(takeId)}`]: json(running),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('Making this file failed on our side.');
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(server.requests).toContainEqual({ method: 'POST', path: paths.addedFiles(takeId), body: choice });
  });

  it('shows the sentence of a refusal', async () => {
    const sentence = 'A take keeps up to 12 added files; remove one to make another.';
    open({
      [list]: json({ items: [] }),
      [`POST ${paths.addedFiles(takeId)}`]: refusal(409, 'conflict', sentence),
    });
    await userEvent.click(await makeButton());
    expect(await screen.findByRole('alert')).toHaveTextContent(sentence);
  });

  it('is removed by its owner', async () => {
    const items = [done];
    open({
      [list]: () => json({ items })(),
      [`DELETE ${paths.addedFile(takeId, id)}`]: () => {
        items.pop();
        return { status: 204 };
      },
    });
    await userEvent.click(await screen.findByRole('button', { name: `Remove ${done.file!.name}` }));
    expect(await makeButton()).toBeEnabled();
    expect(screen.queryByRole('listitem')).not.toBeInTheDocument();
  });

  it('is only there to be heard and kept for somebody who may not change the take', async () => {
    open({ [list]: json({ items: [done] }) }, { ...everything, change: false });
    expect(await screen.findByRole('link', { name: done.file!.name })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: /^Hear it/ })).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Make one|Remove/ })).not.toBeInTheDocument();
  });
});
