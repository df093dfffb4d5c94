import {
  listSessionsResponse,
  listTakesResponse,
  myExportResponse,
  meResponse,
  paths,
  type ExportResponse,
  type MeResponse,
  type UpdateMeRequest,
} from '@thudline/contracts';
import { act, fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe, sampleReport } from '../testing/sampleData';
import { listId, sampleList, sampleListItem } from '../testing/sampleList';
import { SettingsPage } from './SettingsPage';

const takes = [
  sampleListItem({ number: 14, kickPeakDbfs: -2.7 }),
  sampleListItem({ number: 12, kickPeakDbfs: -8.6 }),
  sampleListItem({ number: 11, kickPeakDbfs: -14.2 }),
];
const sessions = [
  {
    id: listId(90),
    device: 'Firefox on Linux',
    current: true,
    readOnly: false,
    usedAt: '2026-12-01T10:00:00.000Z',
  },
  {
    id: listId(91),
    device: 'Safari on an iPhone',
    current: false,
    readOnly: true,
    usedAt: '2026-11-02T10:00:00.000Z',
  },
];
const holds = { takes: 20, rooms: 3, notes: 0, bytes: 310e6 };
const listPath = `${paths.takes}?limit=100`;

/** A server that keeps what it is told of the player. */
function open(routes: FakeRoutes = {}, start: Partial<MeResponse> = {}) {
  let me: MeResponse = { ...sampleMe, ...start };
  const server = fakeServer({
    [`GET ${paths.me}`]: () => ({ json: meResponse.parse(me) }),
    [`PATCH ${paths.me}`]: (body) => {
      const { name, settings } = body as UpdateMeRequest;
      me = { ...me, name: name ?? me.name, settings: { ...me.settings, ...settings } };
      return { json: meResponse.parse(me) };
    },
    [`GET ${paths.sessions}`]: json(listSessionsResponse.parse({ items: sessions })),
    [`GET ${paths.export}`]: json(myExportResponse.parse({ export: null, holds })),
    [`GET ${listPath}`]: json(listTakesResponse.parse(sampleList(takes))),
    [`GET ${paths.report(listId(14))}`]: json(sampleReport({ takeId: listId(14) })),
    ...routes,
  });
  renderPage([{ path: '/settings', element: <SettingsPage /> }], '/settings');
  return {
    ...server,
    changes: () => server.requests.filter(({ method }) => method === 'PATCH').map(({ body }) => body),
  };
}
const grip = (name: string) => screen.findByRole('slider', { name });
const region = (name: string) => screen.findByRole('region', { name });

describe('target and aim', () => {
  it('counts how many takes are on target', async () => {
    open();
    expect(await screen.findByText('1 of your 3 takes')).toBeInTheDocument();
    expect(screen.getByText(/is on target\. Take 11 is low, take 14 hot\./)).toBeInTheDocument();
    expect(screen.getByText('take 14')).toBeInTheDocument();
  });

  it('moves with the arrow keys by half a dB, recounts at once, and is kept as one change', async () => {
    const { changes } = open();
    const upper = await grip('Upper end of the target');
    await screen.findByText('1 of your 3 takes');
    expect(upper).toHaveAttribute('aria-valuetext', '−6.0 dBFS');
    fireEvent.keyDown(upper, { key: 'PageUp' });
    fireEvent.keyDown(upper, { key: 'ArrowRight' });
    expect(upper).toHaveAttribute('aria-valuenow', '-2.5');
    expect(screen.getByText('2 of your 3 takes')).toBeInTheDocument();
    expect(changes()).toEqual([]);
    await waitFor(() =>
      expect(changes()).toEqual([{ settings: { target: { lowDbfs: -12, highDbfs: -2.5, aimDbfs: -9 } } }]),
    );
    expect(await within(await region('Target and aim')).findByText('kept')).toBeInTheDocument();
  });

  it('is kept when the grip is left', async () => {
    const { changes } = open();
    const aim = await grip('Aim');
    aim.focus();
    await userEvent.keyboard('{Home}{Tab}');
    await waitFor(() =>
      expect(changes()).toEqual([{ settings: { target: { lowDbfs: -12, highDbfs: -6, aimDbfs: -12 } } }]),
    );
  });

  it('follows the pointer while a grip is dragged, and is kept when it is let go of', async () => {
    const { changes } = open();
    const lower = await grip('Lower end of the target');
    lower.setPointerCapture = () => undefined;
    lower.hasPointerCapture = () => true;
    // In jsdom the strip is 828 px wide and starts at 0: −24 dBFS lies at 96 px, 0 dBFS at 794 px.
    fireEvent.pointerDown(lower);
    // jsdom has no pointer events with a place.
    fireEvent(
      lower,
      new MouseEvent('pointermove', { bubbles: true, clientX: 96 + ((24 - 15.1) / 24) * 698 }),
    );
    expect(lower).toHaveAttribute('aria-valuenow', '-15');
    expect(await screen.findByText(/Take 14 is hot\./)).toBeInTheDocument();
    expect(changes()).toEqual([]);
    fireEvent.pointerUp(lower);
    await waitFor(() =>
      expect(changes()).toEqual([{ settings: { target: { lowDbfs: -15, highDbfs: -6, aimDbfs: -9 } } }]),
    );
  });

  it('can be typed, with or without the minus sign', async () => {
    const { changes } = open();
    const field = await screen.findByRole('spinbutton', { name: 'Lower end of the target, dBFS' });
    await userEvent.clear(field);
    await userEvent.type(field, '13,5{Enter}');
    await waitFor(() =>
      expect(changes()).toEqual([{ settings: { target: { lowDbfs: -13.5, highDbfs: -6, aimDbfs: -9 } } }]),
    );
    expect(field).toHaveValue('−13.5');
  });

  it('says beside the field what can’t be read, and leaves the target alone', async () => {
    const { changes } = open();
    const field = await screen.findByRole('spinbutton', { name: 'Aim, dBFS' });
    await userEvent.clear(field);
    await userEvent.type(field, 'loud');
    await userEvent.tab();
    expect(screen.getByRole('alert')).toHaveTextContent('Write a number between −40 and −1.');
    expect(field).toHaveValue('−9');
    expect(changes()).toEqual([]);
  });

  it('goes back to what is usual', async () => {
    const { changes } = open(
      {},
      { settings: { ...sampleMe.settings, target: { lowDbfs: -20, highDbfs: -10, aimDbfs: -12 } } },
    );
    await userEvent.click(await screen.findByRole('button', { name: 'back to −12, −6, −9' }));
    await waitFor(() => expect(changes()).toEqual([{ settings: { target: sampleMe.settings.target } }]));
  });

  it('goes back where it was when it could not be kept, and says so', async () => {
    open({ [`PATCH ${paths.me}`]: refusal(500, 'internal', 'Something went wrong here.') });
    const upper = await grip('Upper end of the target');
    fireEvent.keyDown(upper, { key: 'ArrowLeft' });
    expect(upper).toHaveAttribute('aria-valuenow', '-6.5');
    fireEvent.blur(upper);
    expect(await screen.findByRole('alert')).toHaveTextContent('Not kept. Something went wrong here.');
    expect(upper).toHaveAttribute('aria-valuenow', '-6');
  });

  it('can be set before there is a take', async () => {
    open({ [`GET ${listPath}`]: json(listTakesResponse.parse(sampleList([]))) });
    expect(await screen.findByText('Your takes will be counted here.')).toBeInTheDocument();
    expect(await grip('Aim')).toBeInTheDocument();
  });

  it('says when the takes could not be counted, and counts again', async () => {
    let away = true;
    open({
      [`GET ${listPath}`]: () =>
        away ? refusal(503, 'storage-unavailable', 'The store is away.')() : json(sampleList(takes))(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'Your takes could not be counted. The store is away.',
    );
    away = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('1 of your 3 takes')).toBeInTheDocument();
  });
});

describe('name and address', () => {
  it('keeps a name when the field is left', async () => {
    const { changes } = open();
    const field = await screen.findByLabelText('Name');
    await userEvent.clear(field);
    await userEvent.type(field, ' Mika ');
    await userEvent.tab();
    await waitFor(() => expect(changes()).toEqual([{ name: 'Mika' }]));
    expect(await within(await region('You')).findByText('kept')).toBeInTheDocument();
    expect(field).toHaveValue('Mika');
  });

  it('says what is wrong with a name, beside it', async () => {
    const { changes } = open();
    const field = await screen.findByLabelText('Name');
    await userEvent.clear(field);
    await userEvent.tab();
    expect(field).toHaveAccessibleDescription('Write the name others should see.');
    expect(changes()).toEqual([]);
  });

  it('sends the mail for an address that is not verified once more', async () => {
    const { requests } = open(
      { [`POST ${paths.resendVerification}`]: () => ({ status: 204 }) },
      { emailVerified: false },
    );
    expect(await screen.findByText(/not verified yet/)).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'send it again' }));
    expect(await screen.findByText('A mail with a link is on its way.')).toBeInTheDocument();
    expect(requests.some(({ path }) => path === paths.resendVerification)).toBe(true);
  });

  it('says that an address is verified', async () => {
    open({}, { emailVerified: true });
    expect(await screen.findByText('verified')).toBeInTheDocument();
  });
});

describe('a new password', () => {
  const fill = async (old: string, fresh: string) => {
    await userEvent.click(await screen.findByRole('button', { name: 'Set a new password' }));
    await userEvent.type(screen.getByLabelText('Password as it is'), old);
    await userEvent.type(screen.getByLabelText('New password', { selector: 'input' }), fresh);
    await userEvent.click(screen.getByRole('button', { name: 'Set it' }));
  };

  it('is set against the old one', async () => {
    const { requests } = open({ [`POST ${paths.changePassword}`]: () => ({ status: 204 }) });
    await fill('drumsdrums', 'a-quiet-kit-8');
    expect(
      await screen.findByText(/Your new password is set; other devices are signed out\./),
    ).toBeInTheDocument();
    expect(requests.find(({ path }) => path === paths.changePassword)?.body).toEqual({
      oldPassword: 'drumsdrums',
      password: 'a-quiet-kit-8',
    });
  });

  it('is not set against a wrong one', async () => {
    const fields = { oldPassword: 'That is not your password.' };
    open({
      [`POST ${paths.changePassword}`]: () => ({
        status: 400,
        json: { code: 'bad-request', message: 'That is not your password.', details: { fields } },
      }),
    });
    await fill('guess', 'a-quiet-kit-8');
    await waitFor(() =>
      expect(screen.getByLabelText('Password as it is')).toHaveAccessibleDescription(
        'That is not your password.',
      ),
    );
  });
});

describe('units', () => {
  it('are kept as they are chosen, and the speed of sound follows', async () => {
    const { changes } = open();
    expect(await screen.findByText(/sound travels at 343 m\/s/)).toBeInTheDocument();
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Temperature in' }), '°F');
    const field = await screen.findByRole('spinbutton', { name: 'Temperature where you play' });
    await waitFor(() => expect(field).toHaveValue('68 °F'));
    await userEvent.clear(field);
    await userEvent.type(field, '50{Enter}');
    expect(await screen.findByText(/sound travels at 337 m\/s/)).toBeInTheDocument();
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Lengths in' }), 'feet and inches');
    expect(await screen.findByText(/sound travels at 1107 feet a second/)).toBeInTheDocument();
    await waitFor(() =>
      expect(changes()).toEqual([
        { settings: { temperatureUnit: 'fahrenheit' } },
        { settings: { temperatureC: 10 } },
        { settings: { lengthUnit: 'foot' } },
      ]),
    );
  });

  it('say what a temperature can be', async () => {
    const { changes } = open();
    const field = await screen.findByRole('spinbutton', { name: 'Temperature where you play' });
    await userEvent.clear(field);
    await userEvent.type(field, 'warm');
    await userEvent.tab();
    expect(screen.getByRole('alert')).toHaveTextContent('Write a temperature between −20 and 50 °C.');
    expect(changes()).toEqual([]);
  });
});

it('switches single keys off, and lists what they do', async () => {
  const { changes } = open();
  const keys = within(await region('Keys'));
  expect(keys.queryByText('Space')).not.toBeInTheDocument();
  await userEvent.click(keys.getByRole('button', { name: 'see all keys' }));
  expect(keys.getByText('Space')).toBeInTheDocument();
  await userEvent.click(keys.getByRole('checkbox', { name: /^Single keys:/ }));
  await waitFor(() => expect(changes()).toEqual([{ settings: { singleKeys: false } }]));
  expect(await keys.findByText('kept')).toBeInTheDocument();
  expect(keys.getByRole('checkbox')).not.toBeChecked();
});

it('is closed on a phone that reads along', async () => {
  open({}, { readOnly: true });
  expect(await screen.findByRole('alert')).toHaveTextContent('This phone reads along.');
});

it('keeps the last of several quick changes', async () => {
  let held: (() => void)[] = [];
  const { changes } = open({
    [`PATCH ${paths.me}`]: (body) =>
      new Promise((resolve) => {
        const { settings } = body as UpdateMeRequest;
        held = [
          ...held,
          () => resolve({ json: { ...sampleMe, settings: { ...sampleMe.settings, ...settings } } }),
        ];
      }),
  });
  const box = await screen.findByRole('checkbox', { name: /^Single keys:/ });
  await userEvent.click(box);
  await userEvent.click(box);
  expect(changes()).toEqual([{ settings: { singleKeys: false } }]);
  await act(() => Promise.resolve(held[0]()));
  await waitFor(() => expect(changes()).toHaveLength(2));
  await act(() => Promise.resolve(held[1]()));
  expect(box).toBeChecked();
});

it('keeps about what mails are wanted', async () => {
  const { changes } = open();
  const mail = within(await region('Mail me when'));
  expect(mail.getByRole('checkbox', { name: /^a week has gone by/ })).not.toBeChecked();
  await userEvent.click(mail.getByRole('checkbox', { name: 'somebody answers or leaves a note' }));
  await waitFor(() => expect(changes()).toEqual([{ settings: { mailNotes: false } }]));
  expect(await mail.findByText('kept')).toBeInTheDocument();
});

describe('another address', () => {
  const ask = async () => {
    await userEvent.click(await screen.findByRole('button', { name: 'change the e-mail address' }));
    await userEvent.type(screen.getByLabelText('E-mail'), 'juno@new.example');
    await userEvent.type(screen.getByLabelText('Your password'), 'drumsdrums');
    await userEvent.click(screen.getByRole('button', { name: 'Send the mail' }));
  };

  it('is asked for with the password, and counts once its mail was opened', async () => {
    const { requests } = open({ [`POST ${paths.changeEmail}`]: () => ({ status: 204 }) });
    await ask();
    expect(await screen.findByText(/Your address changes when you open its link/)).toBeInTheDocument();
    expect(requests.find(({ path }) => path === paths.changeEmail)?.body).toEqual({
      email: 'juno@new.example',
      password: 'drumsdrums',
    });
    expect(screen.getByText('juno@example.org')).toBeInTheDocument();
  });

  it('says beside the field whose it is already', async () => {
    open({
      [`POST ${paths.changeEmail}`]: refusal(409, 'email-taken', 'This address has an account already.'),
    });
    await ask();
    await waitFor(() =>
      expect(screen.getByLabelText('E-mail')).toHaveAccessibleDescription(
        'This address has an account already.',
      ),
    );
  });
});

describe('the devices', () => {
  it('are listed, and all but this one can be signed out', async () => {
    const { requests } = open({ [`DELETE ${paths.session(listId(91))}`]: () => ({ status: 204 }) });
    const devices = within(await region('Signed in on'));
    expect(await devices.findByText('Firefox on Linux')).toBeInTheDocument();
    expect(devices.getByText('this one, now')).toBeInTheDocument();
    expect(devices.getByText('Safari on an iPhone, reads along')).toBeInTheDocument();
    expect(devices.getAllByRole('button', { name: /^sign out [A-Z]/ })).toHaveLength(1);
    await userEvent.click(devices.getByRole('button', { name: 'sign out Safari on an iPhone' }));
    await waitFor(() =>
      expect(requests.map(({ method, path }) => `${method} ${path}`)).toContain(
        `DELETE ${paths.session(listId(91))}`,
      ),
    );
  });

  it('are signed out all at once', async () => {
    const { requests } = open({ [`DELETE ${paths.sessions}`]: () => ({ status: 204 }) });
    await userEvent.click(await screen.findByRole('button', { name: 'sign out everywhere else' }));
    await waitFor(() => expect(requests.some(({ method }) => method === 'DELETE')).toBe(true));
  });

  it('are asked for again when they could not be listed', async () => {
    let away = true;
    open({
      [`GET ${paths.sessions}`]: () =>
        away ? refusal(500, 'internal', 'Something went wrong.')() : json({ items: sessions })(),
    });
    const devices = within(await region('Signed in on'));
    expect(await devices.findByRole('alert')).toHaveTextContent('Something went wrong.');
    away = false;
    await userEvent.click(devices.getByRole('button', { name: 'Try again' }));
    expect(await devices.findByText('Firefox on Linux')).toBeInTheDocument();
  });
});

describe('the archive of everything', () => {
  const made: ExportResponse = {
    id: listId(92),
    createdAt: '2026-12-01T10:00:00.000Z',
    state: 'done',
    progress: 1,
    reason: null,
    file: { name: 'thudline 2026-12-01.zip', bytes: 305e6, expiresAt: '2026-12-08T10:00:00.000Z' },
  };

  it('is asked for, followed, and downloaded', async () => {
    let latest: ExportResponse | null = null;
    const running: ExportResponse = { ...made, state: 'running', progress: 0.4, file: null };
    open({
      [`GET ${paths.export}`]: () => json({ export: latest, holds })(),
      [`POST ${paths.export}`]: () => {
        latest = running;
        return { json: latest };
      },
    });
    expect(await screen.findByText('20 takes, 3 rooms: one ZIP of about 310.0 MB.')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Export everything' }));
    expect(await screen.findByRole('progressbar', { name: 'Your archive' })).toHaveAttribute(
      'aria-valuenow',
      '40',
    );
    latest = made;
    expect(
      await screen.findByRole('link', { name: 'thudline 2026-12-01.zip' }, { timeout: 4_000 }),
    ).toHaveAttribute('href', paths.exportFile(made.id));
  });

  it('says why it was not made', async () => {
    const failed = { ...made, state: 'failed', file: null, reason: 'Your recordings could not be fetched.' };
    open({ [`GET ${paths.export}`]: json({ export: failed, holds }) });
    expect(await screen.findByText('Your recordings could not be fetched.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Export everything' })).toHaveAttribute(
      'aria-disabled',
      'false',
    );
  });
});

describe('deleting the account', () => {
  const deleteAfter = '2026-12-08T10:00:00.000Z';

  it('asks for the password, says when it goes, and can be stopped', async () => {
    const { requests } = open({
      [`POST ${paths.deletion}`]: json({ ...sampleMe, deleteAfter }, 201),
      [`DELETE ${paths.deletion}`]: json(sampleMe),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'Delete the account' }));
    const dialog = within(screen.getByRole('dialog', { hidden: true }));
    await userEvent.type(dialog.getByLabelText('Your password'), 'drumsdrums');
    await userEvent.click(dialog.getByText('Delete it in 7 days'));
    expect(await screen.findByText(/This account goes on 8 Dec/)).toBeInTheDocument();
    expect(requests.find(({ path }) => path === paths.deletion)?.body).toEqual({ password: 'drumsdrums' });
    await userEvent.click(screen.getByRole('button', { name: 'Keep the account' }));
    expect(await screen.findByRole('button', { name: 'Delete the account' })).toBeInTheDocument();
  });
});
