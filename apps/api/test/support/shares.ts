import {
  CreatedShareResponse,
  createdShareResponse,
  CreateShareRequest,
  OpenedShareResponse,
  openedShareResponse,
  paths,
  ShareSubject,
  TakeResponse,
} from '@thudline/contracts';
import { Browser, Person } from './person';

export async function linkTo(
  person: Person,
  subject: ShareSubject,
  request: Partial<CreateShareRequest> = {},
): Promise<CreatedShareResponse> {
  const response = await person.post(paths.shares, { subject, ...request }).expect(201);
  return createdShareResponse.parse(response.body);
}

export const sharedBy = (
  person: Person,
  take: TakeResponse,
  request: Partial<CreateShareRequest> = {},
): Promise<CreatedShareResponse> => linkTo(person, { kind: 'take', takeId: take.id }, request);

export const tokenOf = ({ url }: { url: string | null }) => (url ?? '').split('/').at(-1) ?? '';

export async function openedBy(
  browser: Browser,
  share: { url: string | null },
): Promise<OpenedShareResponse> {
  const response = await browser.post(paths.openShare, { token: tokenOf(share) }).expect(200);
  return openedShareResponse.parse(response.body);
}
