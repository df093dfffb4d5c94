import { deviceWords } from './device-words';

const chrome = 'AppleWebKit/537.36 (KHTML, like Gecko) Chrome/131.0.0.0';

describe('the words for a device', () => {
  it.each([
    ['Mozilla/5.0 (X11; Linux x86_64; rv:133.0) Gecko/20100101 Firefox/133.0', 'Firefox on Linux'],
    [`Mozilla/5.0 (Windows NT 10.0; Win64; x64) ${chrome} Safari/537.36 Edg/131.0.0.0`, 'Edge on Windows'],
    [`Mozilla/5.0 (Macintosh; Intel Mac OS X 10_15_7) ${chrome} Safari/537.36`, 'Chrome on a Mac'],
    [`Mozilla/5.0 (Linux; Android 15; Pixel 9) ${chrome} Mobile Safari/537.36`, 'Chrome on an Android phone'],
    [`Mozilla/5.0 (Linux; Android 14; SM-X210) ${chrome} Safari/537.36`, 'Chrome on an Android tablet'],
    [
      'Mozilla/5.0 (iPhone; CPU iPhone OS 18_1 like Mac OS X) AppleWebKit/605.1.15 Version/18.1 Mobile/15E148 Safari/604.1',
      'Safari on an iPhone',
    ],
  ])('read %s as %s', (userAgent, words) => {
    expect(deviceWords(userAgent)).toBe(words);
  });

  it('say so where nothing is told, or something odd', () => {
    for (const odd of [null, '', 'curl/8.0'])
      expect(deviceWords(odd)).toBe('a device that doesn’t say what it is');
  });
});
