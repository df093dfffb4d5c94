import { createHmac, timingSafeEqual } from 'node:crypto';
import { CookieOptions, Request, Response } from 'express';
import { v4, validate } from 'uuid';

const guestCookie = 'thudline_guest';
const keptMs = 365 * 24 * 60 * 60 * 1000;

const macOf = (secret: string, id: string) =>
  createHmac('sha256', secret).update(`guest.${id}`).digest('base64url');

/** @returns which guest this browser is, so that they may change what they wrote; null before their first note */
export function guestIdOf(request: Request, secret: string): string | null {
  const value = (request.cookies as Record<string, unknown> | undefined)?.[guestCookie];
  const [id = '', mac = ''] = typeof value === 'string' ? value.split('.') : [];
  const given = Buffer.from(mac);
  const right = Buffer.from(macOf(secret, id));
  const isOurs = given.length === right.length && timingSafeEqual(given, right);
  return isOurs && validate(id) ? id : null;
}

interface SetOptions {
  secret: string;
  isHttps: boolean;
}

/** Makes this browser a guest of its own, or keeps the one it is. */
export function becomeGuest(request: Request, response: Response, { secret, isHttps }: SetOptions): string {
  const id = guestIdOf(request, secret) ?? v4();
  const options: CookieOptions = { httpOnly: true, sameSite: 'lax', secure: isHttps, maxAge: keptMs };
  response.cookie(guestCookie, `${id}.${macOf(secret, id)}`, { ...options, path: '/api' });
  return id;
}
