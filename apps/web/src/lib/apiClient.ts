import { appHeader, errorResponse, paths, type ErrorCode, type ErrorDetails } from '@thudline/contracts';
import type { z } from 'zod';

/** What went wrong, as one sentence that can stand on the page as it is. */
export class ApiError extends Error {
  constructor(
    readonly code: ErrorCode | 'offline',
    message: string,
    readonly details?: ErrorDetails,
  ) {
    super(message);
    this.name = 'ApiError';
  }
}

const final: readonly string[] = ['not-found', 'not-signed-in', 'link-ended', 'forbidden'];

/**
 * The error a page has to show: none while what it read before still stands, unless the answer was that it is gone. One
 * lost answer of a later read must not take a sheet away from somebody who is writing on it.
 */
export function errorToShow(data: unknown, error: Error | undefined): Error | undefined {
  const isFinal = error instanceof ApiError && final.includes(error.code);
  return data === undefined || isFinal ? error : undefined;
}

const offline = () =>
  new ApiError('offline', 'The server did not answer. Check the connection, then try again.');

/** Reads an answer that is not 2xx; any body that is not ours becomes one neutral sentence. */
export async function errorFrom(response: { status: number; text(): Promise<string> }): Promise<ApiError> {
  const text = await response.text();
  const parsed = errorResponse.safeParse(parseJson(text));
  if (parsed.success) return new ApiError(parsed.data.code, parsed.data.message, parsed.data.details);
  return new ApiError('internal', `The server answered ${response.status}. Try again in a moment.`);
}

export function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}

interface RequestOptions {
  method?: 'GET' | 'POST' | 'PATCH' | 'DELETE';
  body?: unknown;
  signal?: AbortSignal;
  /** Only the bytes from `start` to `end` (exclusive). */
  range?: { start: number; end: number };
}

async function send(
  path: string,
  { method = 'GET', body, signal, range }: RequestOptions,
): Promise<Response> {
  const headers: Record<string, string> = { [appHeader.name]: appHeader.value };
  if (body !== undefined) headers['Content-Type'] = 'application/json';
  if (range) headers['Range'] = `bytes=${range.start}-${range.end - 1}`;
  try {
    return await fetch(path, {
      method,
      headers,
      credentials: 'same-origin',
      body: body === undefined ? undefined : JSON.stringify(body),
      signal,
    });
  } catch (cause) {
    if (signal?.aborted) throw cause;
    throw offline();
  }
}

/** One refresh at a time over all tabs; a tab that waited finds the new cookie already there. */
let lastRefreshAtMs = 0;
export async function refreshSession(): Promise<boolean> {
  const askedAtMs = Date.now();
  const refresh = async () => {
    if (lastRefreshAtMs > askedAtMs) return true;
    const response = await send(paths.refresh, { method: 'POST' });
    if (response.ok) lastRefreshAtMs = Date.now();
    return response.ok;
  };
  if (!('locks' in navigator)) return refresh();
  return navigator.locks.request('thudline.refresh', refresh);
}

async function sendSignedIn(path: string, options: RequestOptions): Promise<Response> {
  const first = await send(path, options);
  if (first.ok) answeredAtMs = Date.now();
  if (first.status !== 401 || path === paths.signIn || path === paths.join) return first;
  return (await refreshSession()) ? send(path, options) : first;
}

/** The access cookie lives 15 minutes; what was answered within this time needs no other look. */
const sureForMs = 8 * 60_000;
let answeredAtMs = 0;

export const sessionIsSure = () => Date.now() - answeredAtMs < sureForMs;

/**
 * Renews the session where it may have run out: media elements and plain links send the cookie they find and can't ask
 * for another. Whether it worked shows in what they are answered.
 */
export async function keepSession(): Promise<void> {
  if (sessionIsSure()) return;
  await sendSignedIn(paths.me, {});
  answeredAtMs = Date.now();
}

/** @returns the answer's JSON, checked against `schema` */
export async function requestJson<S extends z.ZodType>(
  path: string,
  schema: S,
  options: RequestOptions = {},
): Promise<z.output<S>> {
  const response = await sendSignedIn(path, options);
  if (!response.ok) throw await errorFrom(response);
  return schema.parse(await response.json());
}

/** For answers without a body. */
export async function requestNothing(path: string, options: RequestOptions): Promise<void> {
  const response = await sendSignedIn(path, options);
  if (!response.ok) throw await errorFrom(response);
}

/** For binary answers. */
export async function requestBytes(
  path: string,
  options: RequestOptions = {},
): Promise<{ bytes: Uint8Array; headers: Headers }> {
  const response = await sendSignedIn(path, options);
  if (!response.ok) throw await errorFrom(response);
  return { bytes: new Uint8Array(await response.arrayBuffer()), headers: response.headers };
}
