import { CookieOptions, Request, Response } from 'express';

const accessCookie = 'thudline_access';
const refreshCookie = 'thudline_refresh';
/** The refresh token travels only to the routes that need it. */
const refreshPath = '/api/auth';

export interface SessionTokens {
  access: string;
  refresh: string;
  /** How long the browser keeps the cookies; null: until it closes. */
  keepMs: number | null;
}

function cookieOf(request: Request, name: string): string | null {
  const value = (request.cookies as Record<string, unknown> | undefined)?.[name];
  return typeof value === 'string' && value !== '' ? value : null;
}

export const accessCookieOf = (request: Request) => cookieOf(request, accessCookie);
export const refreshCookieOf = (request: Request) => cookieOf(request, refreshCookie);

export function setSessionCookies(response: Response, tokens: SessionTokens, isHttps: boolean): void {
  const options: CookieOptions = { httpOnly: true, sameSite: 'lax', secure: isHttps };
  if (tokens.keepMs !== null) options.maxAge = tokens.keepMs;
  response.cookie(accessCookie, tokens.access, { ...options, path: '/' });
  response.cookie(refreshCookie, tokens.refresh, { ...options, path: refreshPath });
}

export function clearSessionCookies(response: Response, isHttps: boolean): void {
  const options: CookieOptions = { httpOnly: true, sameSite: 'lax', secure: isHttps };
  response.clearCookie(accessCookie, { ...options, path: '/' });
  response.clearCookie(refreshCookie, { ...options, path: refreshPath });
}
