import { createHmac, timingSafeEqual } from 'node:crypto';
import { CookieOptions, Request, Response } from 'express';
import { validate } from 'uuid';

const shareCookie = 'thudline_links';
/** Links that one browser keeps open; the one opened longest ago goes first. Keeps the cookie below 500 bytes. */
const mostShares = 12;
const keptMs = 30 * 24 * 60 * 60 * 1000;

const macOf = (secret: string, ids: string) =>
  createHmac('sha256', secret).update(`shares.${ids}`).digest('base64url');

/** @returns ids of the shares this browser has opened; whether they still open anything, the database knows */
export function shareIdsOf(request: Request, secret: string): string[] {
  const value = (request.cookies as Record<string, unknown> | undefined)?.[shareCookie];
  const [ids = '', mac = ''] = typeof value === 'string' ? value.split('.') : [];
  const given = Buffer.from(mac);
  const right = Buffer.from(macOf(secret, ids));
  if (given.length !== right.length || !timingSafeEqual(given, right)) return [];
  return ids.split('_').filter((id) => validate(id));
}

interface SetOptions {
  secret: string;
  isHttps: boolean;
}

export function addShareToCookie(
  request: Request,
  response: Response,
  shareId: string,
  { secret, isHttps }: SetOptions,
): void {
  const others = shareIdsOf(request, secret).filter((id) => id !== shareId);
  const ids = [...others, shareId].slice(-mostShares).join('_');
  const options: CookieOptions = { httpOnly: true, sameSite: 'lax', secure: isHttps, maxAge: keptMs };
  response.cookie(shareCookie, `${ids}.${macOf(secret, ids)}`, { ...options, path: '/api' });
}
