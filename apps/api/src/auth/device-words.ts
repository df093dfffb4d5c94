import { Request } from 'express';

/** What a browser says of itself, as much as is kept. */
export const userAgentOf = (request: Request): string | null =>
  request.get('User-Agent')?.slice(0, 300) ?? null;

/** In this order: browsers name each other for the sake of old servers. */
const browsers: [RegExp, string][] = [
  [/Edg(e|A|iOS)?\//, 'Edge'],
  [/OPR\/|Opera/, 'Opera'],
  [/SamsungBrowser\//, 'Samsung Internet'],
  [/Firefox\/|FxiOS\//, 'Firefox'],
  [/Chrome\/|CriOS\/|Chromium\//, 'Chrome'],
  [/Safari\//, 'Safari'],
];
const systems: [RegExp, string][] = [
  [/iPhone|iPod/, 'an iPhone'],
  [/iPad/, 'an iPad'],
  [/Android(?!.*Mobile)/, 'an Android tablet'],
  [/Android/, 'an Android phone'],
  [/CrOS/, 'a Chromebook'],
  [/Windows/, 'Windows'],
  [/Macintosh|Mac OS X/, 'a Mac'],
  [/Linux|X11/, 'Linux'],
];

const named = (names: [RegExp, string][], text: string) => names.find(([pattern]) => pattern.test(text))?.[1];

/** "Firefox on Linux": enough to know one's own devices again. A browser may say what it likes. */
export function deviceWords(userAgent: string | null): string {
  const browser = named(browsers, userAgent ?? '');
  const system = named(systems, userAgent ?? '');
  if (browser && system) return `${browser} on ${system}`;
  return browser ?? system ?? 'a device that doesn’t say what it is';
}
