import {
  complaintResponse,
  paths,
  type AccountResponse,
  type AuditEntry,
  type FailedWork,
  type InstallationSettings,
  type MeResponse,
} from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { listId } from '../testing/sampleList';
import { AdminPage } from './AdminPage';

const mika: AccountResponse = {
  id: listId(50),
  name: 'Mika',
  email: 'mika@example.org',
  emailVerified: false,
  roles: ['player'],
  locked: false,
  joinedAt: '2026-11-01T10:00:00.000Z',
  seenAt: null,
  takes: 3,
  bytes: 15e6,
  quotaBytes: null,
  deleteAfter: null,
};
const failed: FailedWork = {
  kind: 'measurement',
  id: listId(51),
  at: '2026-11-01T10:00:00.000Z',
  what: 'take 3',
  account: { id: mika.id, name: 'Mika' },
  reason: 'It broke.',
  againAt: null,
};
const joined: AuditEntry = {
  id: listId(52),
  at: '2026-11-01T10:00:00.000Z',
  kind: 'joined',
  account: { id: mika.id, name: 'Mika' },
  subject: null,
  address: '192.0.2.7',
};
const settings: InstallationSettings = { accountBytes: 20e9, signUp: 'open' };

function open(routes: FakeRoutes = {}, me: Partial<MeResponse> = { roles: ['player', 'admin'] }) {
  const server = fakeServer({
    [`GET ${paths.me}`]: json({ ...sampleMe, ...me }),
    [`GET ${paths.adminAccounts}`]: json({ items: [mika], next: null, total: 1, bytes: 15e6 }),
    [`GET ${paths.adminWork}`]: json({ items: [failed] }),
    [`GET ${paths.complaints}`]: json({ items: [] }),
    [`GET ${paths.adminAudit}`]: json({ items: [joined], next: null }),
    [`GET ${paths.adminSettings}`]: json(settings),
    ...routes,
  });
  renderPage([{ path: '/admin', element: <AdminPage /> }], '/admin');
  return {
    ...server,
    writes: () => server.requests.filter(({ method }) => method !== 'GET'),
  };
}
const table = async (name: string) => within(await screen.findByRole('table', { name }));

describe('the page of whoever runs the installation', () => {
  it('opens with what needs them', async () => {
    open();
    expect(await screen.findByText('1 thing failed.')).toBeInTheDocument();
    expect(
      await screen.findByRole('heading', { level: 1, name: /1 account keeps 15\.0 MB\./ }),
    ).toBeInTheDocument();
  });

  it('is no page to anybody else', async () => {
    const { requests } = open({}, { roles: ['player', 'teacher'] });
    await waitFor(() => expect(screen.queryByRole('status', { name: 'Loading' })).not.toBeInTheDocument());
    expect(screen.queryByText('Accounts')).not.toBeInTheDocument();
    expect(requests.map(({ path }) => path)).toEqual([paths.me]);
  });

  it('finds an account, gives it a role, a limit and a lock', async () => {
    const { requests, writes } = open({
      [`PATCH ${paths.adminAccount(mika.id)}`]: (body) => ({ json: { ...mika, ...(body as object) } }),
    });
    await userEvent.type(await screen.findByLabelText('Find by name or address'), 'mik');
    await waitFor(() => expect(requests.some(({ path }) => path.endsWith('?find=mik'))).toBe(true));
    const accounts = await table('Accounts');
    expect(accounts.getByText('15.0 MB')).toBeInTheDocument();
    await userEvent.click(accounts.getByRole('button', { name: 'change Mika, mika@example.org' }));
    await userEvent.click(accounts.getByRole('checkbox', { name: 'teacher' }));
    const limit = accounts.getByRole('spinbutton', { name: 'Limit in GB' });
    await userEvent.clear(limit);
    await userEvent.type(limit, '5{Enter}');
    await userEvent.click(accounts.getByRole('button', { name: 'Lock' }));
    await waitFor(() =>
      expect(writes().map(({ body }) => body)).toEqual([
        { roles: ['player', 'teacher'] },
        { quotaBytes: 5e9 },
        { locked: true },
      ]),
    );
  });

  it('says why an account could not be changed', async () => {
    open({
      [`PATCH ${paths.adminAccount(mika.id)}`]: refusal(409, 'conflict', 'You would shut yourself out.'),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'change Mika, mika@example.org' }));
    await userEvent.click(screen.getByRole('button', { name: 'Lock' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('You would shut yourself out.');
  });

  it('has failed work done again', async () => {
    let items = [failed];
    open({
      [`GET ${paths.adminWork}`]: () => ({ json: { items } }),
      [`POST ${paths.adminRetry('measurement', failed.id)}`]: () => {
        items = [];
        return { status: 204 };
      },
    });
    await userEvent.click(await screen.findByRole('button', { name: 'try measuring, take 3 again' }));
    expect(await screen.findByText('Nothing has failed.')).toBeInTheDocument();
    expect(screen.getByText('Nothing failed.')).toBeInTheDocument();
  });

  it('settles a complaint, and takes the note away', async () => {
    const complaint = complaintResponse.parse({
      id: listId(60),
      createdAt: '2026-11-02T10:00:00.000Z',
      reason: 'An advertisement.',
      from: 'Juno',
      take: { id: listId(61), number: 14, player: 'Juno' },
      note: { id: listId(62), name: 'Bex', body: 'Buy my pills.', isRemoved: false },
      settledAt: null,
    });
    let items = [complaint];
    const { writes } = open({
      [`GET ${paths.complaints}`]: () => ({ json: { items } }),
      [`PATCH ${paths.complaint(complaint.id)}`]: () => {
        const note = { ...complaint.note!, isRemoved: true };
        items = [{ ...complaint, note, settledAt: '2026-11-02T11:00:00.000Z' }];
        return { status: 204 };
      },
    });
    const complaints = await table('Complaints');
    expect(complaints.getByText('Buy my pills.')).toBeInTheDocument();
    await userEvent.click(complaints.getByRole('button', { name: 'remove the note' }));
    expect(await screen.findByText('removed')).toBeInTheDocument();
    expect(writes()).toMatchObject([{ path: paths.complaint(complaint.id), body: { removeNote: true } }]);
  });

  it('tells what happened', async () => {
    open();
    const audit = await table('What happened');
    expect(audit.getByText('Mika joined')).toBeInTheDocument();
    expect(audit.getByText('192.0.2.7')).toBeInTheDocument();
  });

  it('sets who may join, and invites somebody', async () => {
    const { writes } = open({
      [`PATCH ${paths.adminSettings}`]: (body) => ({ json: { ...settings, ...(body as object) } }),
      [`POST ${paths.adminInvitations}`]: () => ({ status: 204 }),
    });
    await userEvent.selectOptions(
      await screen.findByRole('combobox', { name: 'Who may join' }),
      'whoever is invited',
    );
    const form = within(screen.getByRole('form', { name: 'Invite somebody' }));
    await userEvent.type(form.getByLabelText('E-mail'), 'runa@example.org');
    await userEvent.click(form.getByRole('button', { name: 'Invite' }));
    expect(await screen.findByText('A mail is on its way to runa@example.org.')).toBeInTheDocument();
    expect(writes().map(({ body }) => body)).toEqual([{ signUp: 'invited' }, { email: 'runa@example.org' }]);
  });

  it('says what could not be read, and reads it again', async () => {
    let away = true;
    open({
      [`GET ${paths.adminAudit}`]: () =>
        away
          ? refusal(500, 'internal', 'Something went wrong here.')()
          : json({ items: [joined], next: null })(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('Something went wrong here.');
    away = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Mika joined')).toBeInTheDocument();
  });
});
