import { bytesSource } from './bytesSource';
import { openWav } from './openWav';
import { chunk, fmt, pcmGuid, riff } from './testing/handMadeWav';

const text = (ascii: string) => Uint8Array.from([...ascii].map((letter) => letter.charCodeAt(0)));
const padded = (head: string) => text(head.padEnd(64, '\0'));
const sound = chunk('data', new Uint8Array(64));

const refusals: [string, Uint8Array, string, RegExp][] = [
  ['an empty file', new Uint8Array(0), 'empty', /empty/],
  ['plain text', text('this is a shopping list'), 'not-wav', /isn't a WAV/],
  ['text in UTF-16', text('\xff\xfeh\0i\0!\0!\0'), 'not-wav', /isn't a WAV/],
  ['one byte', text('R'), 'not-wav', /isn't a WAV/],
  ['MP3 with tags', padded('ID3\x04'), 'lossy', /MP3/],
  ['MP3 without tags', padded('\xff\xfb\x90\x64'), 'lossy', /MP3/],
  ['AAC in ADTS', padded('\xff\xf1\x50\x80'), 'lossy', /AAC/],
  ['M4A', padded('\0\0\0\x20ftypM4A '), 'lossy', /M4A/],
  ['Ogg', padded('OggS'), 'lossy', /Ogg/],
  ['FLAC', padded('fLaC'), 'container', /FLAC/],
  ['AIFF', padded('FORM\0\0\0\x20AIFF'), 'container', /AIFF/],
  ['CAF', padded('caff'), 'container', /CAF/],
  ['RIFX', padded('RIFX\0\0\0\x20WAVE'), 'container', /RIFX/],
  ['a RIFF film', padded('RIFF\x20\0\0\0AVI '), 'not-wav', /no WAV sound/],
  ['A-law', riff([fmt({ tag: 6, bits: 8 }), sound]), 'encoding', /A-law/],
  ['µ-law', riff([fmt({ tag: 7, bits: 8 }), sound]), 'encoding', /µ-law/],
  ['ADPCM', riff([fmt({ tag: 2, bits: 4, blockAlign: 256 }), sound]), 'encoding', /ADPCM/],
  ['MP3 inside WAV', riff([fmt({ tag: 0x55, bits: 0, blockAlign: 1 }), sound]), 'lossy', /MP3/],
  ['an unknown tag', riff([fmt({ tag: 0x1234 }), sound]), 'encoding', /0x1234/],
  [
    'an unknown sub-format',
    riff([fmt({ extensible: { validBits: 16, guid: pcmGuid.map((byte) => byte ^ 0x55) } }), sound]),
    'encoding',
    /unknown kind/,
  ],
  ['36-bit samples', riff([fmt({ bits: 36 }), sound]), 'encoding', /36-bit/],
  ['4-bit samples', riff([fmt({ bits: 4 }), sound]), 'encoding', /4-bit/],
  ['0-bit samples', riff([fmt({ bits: 0 }), sound]), 'encoding', /0-bit/],
  ['16-bit float', riff([fmt({ bits: 16, tag: 3 }), sound]), 'encoding', /16-bit float/],
  ['65,535 channels', riff([fmt({ channels: 65535 }), sound]), 'channels', /65535 channels/],
  ['no channel', riff([fmt({ channels: 0 }), sound]), 'channels', /0 channels/],
  ['33 channels', riff([fmt({ channels: 33 }), sound]), 'channels', /33 channels/],
  ['1,234 Hz', riff([fmt({ sampleRateHz: 1234 }), sound]), 'rate', /1234 Hz/],
  ['4 GHz', riff([fmt({ sampleRateHz: 0xffffffff }), sound]), 'rate', /4294967295 Hz/],
  ['0 bytes a frame', riff([fmt({ blockAlign: 0 }), sound]), 'damaged', /contradicts itself/],
  ['too many bytes a frame', riff([fmt({ blockAlign: 65535 }), sound]), 'damaged', /contradicts itself/],
  [
    '24 bits in 4 bytes, left or right unsaid',
    riff([fmt({ bits: 24, blockAlign: 4 }), sound]),
    'damaged',
    /24-bit/,
  ],
  ['a head and nothing else', riff([]), 'cut-off', /cut off/],
  ['nine bytes', text('RIFF\0\0\0\0W'), 'cut-off', /cut off/],
  ['a fmt chunk cut in the middle', riff([fmt({})]).subarray(0, 30), 'cut-off', /cut off/],
  ['sound without a format', riff([sound]), 'cut-off', /cut off/],
  ['a format without sound', riff([fmt({})]), 'no-frames', /no sound/],
  [
    'no frame at all',
    riff([fmt({}), chunk('data', new Uint8Array(0)), chunk('LIST', new Uint8Array(8))]),
    'no-frames',
    /frame/,
  ],
  [
    'half a frame',
    riff([fmt({ channels: 2 }), chunk('data', new Uint8Array(3))]),
    'no-frames',
    /not one whole frame/,
  ],
  [
    'nothing but empty chunks',
    riff(Array<Uint8Array>(6000).fill(chunk('abcd', new Uint8Array(0)))),
    'damaged',
    /never lead/,
  ],
];

describe('openWav refuses with one sentence', () => {
  it.each(refusals)('%s', async (_what, bytes, code, sentence) => {
    const refusal = await openWav(bytesSource(bytes)).then(
      () => null,
      (error: Error) => error,
    );
    expect(refusal).toMatchObject({
      name: 'WavError',
      code,
      message: expect.stringMatching(sentence) as string,
    });
    expect(refusal?.message).toMatch(/^[A-Z][^.]*\.$/);
    expect(refusal?.message).toMatch(/export|copy/);
  });
});
