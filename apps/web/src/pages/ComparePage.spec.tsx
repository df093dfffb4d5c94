import { paths } from '@thudline/contracts';
import { encodeWav } from '@thudline/dsp';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { afterId, beforeId, servedComparison } from '../testing/sampleComparison';
import { sampleMe } from '../testing/sampleData';
import { listId } from '../testing/sampleList';
import { ComparePage } from './ComparePage';

const played: string[] = [];
jest.mock('../lib/audio/takesPlayer', () => ({
  TakesPlayer: class {
    constructor({ selected }: { selected: number }) {
      played.push(`ready, take ${selected}`);
    }
    play = (fromS: number) => Promise.resolve(void played.push(`play from ${fromS.toFixed(2)}`));
    select = (index: number) => void played.push(`take ${index}`);
    stop = () => void played.push('stop');
    positionS = () => 0;
    close = () => undefined;
  },
}));
beforeEach(() => played.splice(0));

function open(routes: FakeRoutes = {}, comparison: Parameters<typeof servedComparison>[0] = {}) {
  const server = fakeServer({
    [`GET ${paths.shares}`]: json({ items: [] }),
    ...servedComparison(comparison),
    ...routes,
  });
  const page = renderPage(
    [{ path: '/compare/:beforeId/:afterId', element: <ComparePage /> }],
    `/compare/${beforeId}/${afterId}`,
  );
  return { ...server, ...page };
}

/** Half a second of each microphone. */
function takeWav() {
  const tone = Float32Array.from({ length: 24_000 }, (_, i) => 0.3 * Math.sin(i / 120));
  return { bytes: encodeWav({ channels: [tone, tone], sampleRateHz: 48_000, bitDepth: 16 }) };
}
const sounds: FakeRoutes = {
  [`GET ${paths.listen(beforeId)}`]: takeWav,
  [`GET ${paths.listen(afterId)}`]: takeWav,
};

describe('a comparison', () => {
  it('waits without jumping while it is loading', () => {
    open({ [`GET ${paths.comparison(beforeId, afterId)}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('opens with what became of it, then what differed', async () => {
    open();
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      'The flip worked: 1.3 dB of low end came back; we expected 1.4. Leave the kick preamp there.',
    );
    const differed = screen.getByRole('table', { name: 'What differed' });
    expect(within(differed).getByRole('row', { name: /overhead polarity/ })).toHaveTextContent(
      'not pressedpressed',
    );
    expect(screen.getByText(/the sound confirms it/)).toHaveTextContent('Positions are the same.');
  });

  it('sets what both sheets say beside each other, the word of each first', async () => {
    open();
    const says = await screen.findByRole('table', { name: 'What each take says' });
    const levels = within(says).getByRole('row', { name: /^Levels/ });
    const [before, after] = within(levels).getAllByRole('cell');
    expect(before).toHaveTextContent('hot. The hardest kick hit peaks at −2.7 dBFS.');
    expect(after).toHaveTextContent('on target. All is well there.');
    expect(within(says).getByRole('row', { name: /^Adding up/ })).toHaveTextContent(/flip\..*keep\./);
  });

  it('says nothing twice: what the word says is left out of the sentence', async () => {
    const flip = {
      topic: 'adding-up' as const,
      status: 'fix' as const,
      sentence:
        'Flip the overhead: low end cancels in 8 of 8 hits, flipping returns 1.4 dB; no retake needed.',
      why: '',
      next: '',
    };
    const arrival = { ...flip, topic: 'arrival' as const, sentence: 'The overhead hears the kick later.' };
    open(
      {},
      {
        findings: [
          { topic: 'arrival', before: arrival, after: null },
          { topic: 'adding-up', before: flip, after: null },
        ],
      },
    );
    const says = await screen.findByRole('table', { name: 'What each take says' });
    const [before, after] = within(within(says).getByRole('row', { name: /^Adding up/ })).getAllByRole(
      'cell',
    );
    expect(before).toHaveTextContent(/^flip\. Low end cancels in 8 of 8 hits, flipping returns 1\.4 dB\.$/);
    expect(after).toHaveTextContent('–');
  });

  it('tells each change in a word, or that there is none, or why it can’t', async () => {
    open();
    const changed = await screen.findByRole('table', { name: 'What changed, and how surely' });
    const row = (name: RegExp) => within(changed).getByRole('row', { name });
    expect(row(/^low end, added up/)).toHaveTextContent(/−0\.7 → 0\.6 dB.*\+1\.1 to \+1\.5.*fuller/);
    expect(row(/^hardest kick hit/)).toHaveTextContent(/−2\.7 → −8\.9 dBFS.*lower/);
    expect(within(changed).queryByRole('row', { name: /^decay, 500 Hz/ })).not.toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: /^all \d+ figures$/ }));
    expect(row(/^decay, 500 Hz/)).toHaveTextContent(/−4 to \+8 %.*no clear change/);
    expect(row(/^attack/)).toHaveTextContent(/strength can’t be matched.*can’t tell/);
    expect(screen.getByRole('complementary', { name: 'a Thudline, matching' })).toBeInTheDocument();
  });

  it('has the figures as a table with steps and hits', async () => {
    open();
    const changed = await screen.findByRole('region', { name: 'What changed, and how surely' });
    await userEvent.click(within(changed).getByRole('button', { name: 'as a table' }));
    const table = within(changed).getByRole('group', { name: 'Table of what changed' });
    expect(within(table).getByRole('row', { name: /^low end/ })).toHaveTextContent(
      /\+1\.30.*0\.520, 21fuller/,
    );
    expect(within(table).getByRole('row', { name: /^hardest kick/ })).toHaveTextContent('whole take');
  });

  it('shows the same hit of both and how both add up', async () => {
    open();
    expect(
      await screen.findByRole('img', { name: /^Kick and overhead, take 14, hit 2:/ }),
    ).toBeInTheDocument();
    expect(screen.getByRole('img', { name: /^Kick and overhead, take 15, hit 2:/ })).toBeInTheDocument();
    expect(
      screen.getByRole('img', { name: /^Low end of the two added.*take 14 −0\.7 dB; take 15 \+0\.6 dB/ }),
    ).toBeInTheDocument();
    expect(await screen.findByRole('img', { name: /^Third-octaves of the two added/ })).toBeInTheDocument();
    await userEvent.keyboard('{ArrowRight}');
    expect(await screen.findByRole('img', { name: /take 15, hit 3:/ })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Both, from hit 3' })).toBeInTheDocument();
  });

  it('plays both in step and switches by key, and says what is turned down', async () => {
    open(sounds);
    await userEvent.click(await screen.findByRole('button', { name: 'Both, from hit 2' }));
    expect(await screen.findByRole('button', { name: 'Stop' })).toBeInTheDocument();
    await userEvent.keyboard('1');
    const heard = screen.getByRole('group', { name: 'Take that is heard' });
    expect(within(heard).getByRole('button', { name: 'take 14' })).toHaveAttribute('aria-pressed', 'true');
    fireEvent.keyDown(document.body, { key: '0' });
    // The second kick comes 1.1 s after the first, and is begun a little before.
    expect(played).toEqual(['ready, take 1', 'play from 1.04', 'take 0', 'stop']);
    expect(screen.getByText(/equally loud/)).toBeInTheDocument();
  });

  it('says so where the sound could not be loaded', async () => {
    open();
    await userEvent.click(await screen.findByRole('button', { name: 'Both, from hit 2' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('The takes could not be loaded.');
    expect(screen.getByRole('button', { name: 'Both, from hit 2' })).toBeInTheDocument();
  });

  it('leaves single keys alone where they are switched off', async () => {
    const me = { ...sampleMe, settings: { ...sampleMe.settings, singleKeys: false } };
    open({ [`GET ${paths.me}`]: json(me) });
    await screen.findByRole('button', { name: 'Both, from hit 2' });
    await userEvent.keyboard('{ArrowRight}?');
    expect(screen.getByRole('button', { name: 'Both, from hit 2' })).toBeInTheDocument();
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  });

  it('exchanges a take for another, and swaps the two', async () => {
    const { address } = open();
    expect(await screen.findByRole('link', { name: 'swap them' })).toHaveAttribute(
      'href',
      `/compare/${afterId}/${beforeId}`,
    );
    await waitFor(() =>
      expect(screen.getByRole('combobox', { name: 'Take before' })).toHaveTextContent('take 13, 5 cm inside'),
    );
    await userEvent.selectOptions(
      screen.getByRole('combobox', { name: 'Take before' }),
      'take 13, 5 cm inside',
    );
    expect(address()).toBe(`/compare/${listId(13)}/${afterId}`);
  });

  it('asks for no sound where there is no right to hear', async () => {
    const silent = { number: 14, title: '', recordedAt: '2026-12-02T19:40:00.000Z', canListen: false };
    const { requests } = open({}, { before: { ...silent, id: beforeId } });
    await screen.findByRole('region', { name: 'How they add up' });
    expect(screen.queryByRole('button', { name: /^Both/ })).not.toBeInTheDocument();
    expect(requests.some(({ path }) => path.includes('/excerpt'))).toBe(false);
  });
});

describe('a comparison that can’t be shown', () => {
  const answered = (status: number, code: string, message: string) =>
    open({ [`GET ${paths.comparison(beforeId, afterId)}`]: refusal(status, code, message) });

  it('says that there are no such takes', async () => {
    answered(404, 'not-found', 'There is nothing here.');
    expect(await screen.findByRole('alert')).toHaveTextContent('There are no such two takes here.');
  });

  it('says that one is not measured yet', async () => {
    answered(409, 'not-measured-yet', 'This take has not been measured yet.');
    expect(await screen.findByRole('alert')).toHaveTextContent('One of the takes is not measured yet.');
    expect(screen.getByRole('button', { name: 'Look again' })).toBeInTheDocument();
  });

  it('offers to try again after a failure, and then opens', async () => {
    let failing = true;
    const good = servedComparison()[`GET ${paths.comparison(beforeId, afterId)}`];
    const bad = refusal(500, 'internal', 'Something went wrong here.');
    open({ [`GET ${paths.comparison(beforeId, afterId)}`]: (body) => (failing ? bad() : good(body)) });
    expect(await screen.findByRole('alert')).toHaveTextContent('Something went wrong here.');
    failing = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent('The flip worked:');
  });
});
