import { safeFileName } from './safe-file-name';

describe('safeFileName', () => {
  it('keeps an ordinary name, also outside ASCII', () => {
    expect(safeFileName('große Trommel 2.wav')).toBe('große Trommel 2.wav');
  });

  it('drops folders of either kind of slash', () => {
    expect(safeFileName('C:\\takes\\kick.wav')).toBe('kick.wav');
    expect(safeFileName('../../etc/passwd')).toBe('passwd');
  });

  it('drops line breaks, quotes and characters that turn the direction of text', () => {
    expect(safeFileName('kick\r\n"\u202egnp.wav')).toBe('kickgnp.wav');
  });

  it('gives a name where nothing is left', () => {
    expect(safeFileName('')).toBe('recording.wav');
    expect(safeFileName('..')).toBe('recording.wav');
  });

  it('shortens a long name and keeps its extension', () => {
    const name = safeFileName(`${'k'.repeat(300)}.wav`);
    expect(name).toHaveLength(120);
    expect(name.endsWith('k.wav')).toBe(true);
  });
});
