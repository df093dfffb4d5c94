import { appHeader, paths } from '@thudline/contracts';

export interface Answer {
  status: number;
  json: unknown;
}

export interface Session {
  get(path: string): Promise<Answer>;
  post(path: string, body: object | FormData): Promise<Answer>;
  bytes(path: string): Promise<Buffer>;
}

/** Somebody who has joined; signs in afresh by the refresh token where the short one has run out. */
export async function joinAs(url: string, name: string): Promise<Session> {
  const cookies = new Map<string, string>();
  const once = async (path: string, init: RequestInit): Promise<Response> => {
    const headers = new Headers(init.headers);
    headers.set(appHeader.name, appHeader.value);
    headers.set('Origin', url);
    headers.set('Connection', 'close');
    headers.set('Cookie', [...cookies].map(([key, value]) => `${key}=${value}`).join('; '));
    const response = await fetch(new URL(path, url), { ...init, headers });
    for (const line of response.headers.getSetCookie()) {
      const pair = line.split(';', 1)[0] ?? '';
      cookies.set(pair.slice(0, pair.indexOf('=')), pair.slice(pair.indexOf('=') + 1));
    }
    return response;
  };
  const send = async (path: string, init: RequestInit = {}): Promise<Response> => {
    const response = await once(path, init);
    if (response.status !== 401) return response;
    await once(paths.refresh, { method: 'POST' });
    return once(path, init);
  };
  const told = async (response: Response): Promise<Answer> => {
    const text = await response.text();
    return { status: response.status, json: text ? (JSON.parse(text) as unknown) : null };
  };
  const post = async (path: string, body: object | FormData) =>
    told(
      await send(path, {
        method: 'POST',
        ...(body instanceof FormData
          ? { body }
          : { body: JSON.stringify(body), headers: { 'Content-Type': 'application/json' } }),
      }),
    );
  const joined = await post(paths.join, {
    name,
    email: `${name.toLowerCase()}@example.org`,
    password: 'a long enough phrase for a check',
  });
  if (joined.status !== 201) throw new Error(`${name} can't join: ${JSON.stringify(joined.json)}`);
  return {
    get: async (path) => told(await send(path)),
    post,
    async bytes(path) {
      const response = await send(path);
      if (!response.ok) throw new Error(`${path} answered ${response.status}`);
      return Buffer.from(await response.arrayBuffer());
    },
  };
}
