import { defaultUserSettings } from '@thudline/contracts';
import { sampleReport, sampleTake } from '../../testing/sampleData';
import { figureGroups } from './components/figureRows';
import { figuresCsv, figuresFileName, figuresJson, figuresText } from './figuresFile';

const groups = figureGroups(sampleReport(), defaultUserSettings);

describe('figures to take along', () => {
  it('are comma-separated with numbers a spreadsheet can read', () => {
    const lines = figuresCsv(groups).trimEnd().split('\r\n');
    expect(lines[0]).toBe('section,figure,unit,kick or both,overhead,definition,source');
    expect(lines[1]).toMatch(/^Levels,Hardest hit,dBFS,-2.70,-8.40,"/);
    // A row each, and one for each octave of what is told by octaves.
    const values = groups.flatMap((group) => group.rows).map((row) => row.values.length);
    const expected = values.reduce((sum, count) => sum + (count > 2 ? count : 1), 1);
    expect(lines).toHaveLength(expected);
    expect(lines.find((line) => line.includes('"Decay, 2 kHz"'))).toMatch(/,s,0\.34,,/);
  });

  it('never hand a spreadsheet a formula', () => {
    const row = { label: '=1+1', unit: '', values: ['-2.70', '@x'], definition: 'a "b"', source: '' };
    const csv = figuresCsv([{ title: 'T', columns: [], rows: [row] }]);
    expect(csv).toContain(`T,'=1+1,,-2.70,'@x,"a ""b""",`);
  });

  it('read as lines in a message', () => {
    expect(figuresText(groups)).toContain('Hardest hit: kick −2.70, overhead −8.40 dBFS');
  });

  it('are the whole report for programs', () => {
    expect(JSON.parse(figuresJson(sampleReport()))).toEqual(sampleReport());
  });

  it('get a file name that every system takes', () => {
    expect(figuresFileName(sampleTake({ number: 14, title: '8 cm inside, “again”/é' }), 'csv')).toBe(
      'take-14-8-cm-inside-again-e.csv',
    );
    expect(figuresFileName({ number: 2, title: '' }, 'json')).toBe('take-2.json');
  });
});
