/** What the faked server answers, by "METHOD path"; anything else is 404 in the API's own words. */
export type FakeRoutes = Record<string, (body: unknown) => FakeAnswer | Promise<FakeAnswer>>;

interface FakeAnswer {
  status?: number;
  json?: unknown;
  bytes?: Uint8Array;
  headers?: Record<string, string>;
}

export const json =
  (value: unknown, status = 200) =>
  () => ({ status, json: value });
export const refusal = (status: number, code: string, message: string) => () => ({
  status,
  json: { code, message },
});

/** Puts a faked server in place of fetch; the requests it got are kept in order. */
export function fakeServer(routes: FakeRoutes) {
  const requests: { method: string; path: string; body: unknown }[] = [];
  globalThis.fetch = async (path: RequestInfo | URL, init: RequestInit = {}) => {
    if (typeof path !== 'string') throw new Error('the client asks for paths');
    const method = init.method ?? 'GET';
    const body: unknown = typeof init.body === 'string' ? JSON.parse(init.body) : undefined;
    requests.push({ method, path, body });
    const route = routes[`${method} ${path}`] ?? routes[`${method} ${path.split('?')[0]}`];
    const answer = route
      ? await route(body)
      : { status: 404, json: { code: 'not-found', message: 'There is nothing here.' } };
    return responseOf(answer);
  };
  return { requests };
}

function responseOf({ status = 200, json: value, bytes, headers = {} }: FakeAnswer): Response {
  const text = bytes ? '' : JSON.stringify(value ?? null);
  const buffer = bytes ? bytes.slice().buffer : new TextEncoder().encode(text).buffer;
  return {
    ok: status >= 200 && status < 300,
    status,
    headers: new Map(Object.entries(headers)) as unknown as Headers,
    text: () => Promise.resolve(text),
    json: () => Promise.resolve(JSON.parse(text) as unknown),
    arrayBuffer: () => Promise.resolve(buffer),
  } as Response;
}
