import { csvOf } from './csv';

describe('comma-separated values', () => {
  it('hold texts, numbers and nothing', () => {
    expect(csvOf(['day', 'dB', 'note'], [['2026-10-05', -61.5, null]])).toBe(
      'day,dB,note\r\n2026-10-05,-61.5,\r\n',
    );
  });

  it('keep what is written in one cell, and run nothing', () => {
    expect(csvOf(['note'], [['a "b", c\nd'], ['=1+1'], ['-3 dB']])).toBe(
      'note\r\n"a ""b"", c\nd"\r\n\'=1+1\r\n\'-3 dB\r\n',
    );
  });
});
