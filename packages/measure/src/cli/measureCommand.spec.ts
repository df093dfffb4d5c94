import { reportFigures } from '@thudline/contracts';
import { simpleTake, takeFolder, type TakeFolder } from '../testing/takeFolder';
import { measureCommand } from './measureCommand';

let folder: TakeFolder;
let kick: string;
let overhead: string;
let both: string;

beforeAll(async () => {
  folder = await takeFolder();
  const take = simpleTake({ seconds: 4 });
  kick = await folder.wav('kick.wav', [take.kick]);
  overhead = await folder.wav('overhead.wav', [take.overhead]);
  both = await folder.wav('both.wav', [take.overhead.map((x, i) => x + 0.2 * Math.sin(i)), take.kick]);
});
afterAll(() => folder?.remove());

describe('npm run measure', () => {
  it('prints the report as JSON that the contract accepts', async () => {
    const { exitCode, stdout, stderr } = await measureCommand([
      kick,
      overhead,
      '--json',
      '--target',
      '-14:-8',
    ]);
    expect([exitCode, stderr]).toEqual([0, '']);
    const report = reportFigures.parse(JSON.parse(stdout));
    expect(report).toMatchObject({ version: 2, sampleRateHz: 48000, durationS: 4 });
    expect(report.agreement.verdict).toBe('flip');
    expect(stdout).not.toMatch(/-?\d+\.\d{7}/);
  });

  it('prints findings first and figures with units after', async () => {
    const { exitCode, stdout } = await measureCommand([kick, overhead]);
    expect(exitCode).toBe(0);
    expect(stdout).toMatch(/Flip the overhead/);
    expect(stdout.indexOf('Flip the overhead')).toBeLessThan(stdout.indexOf('sample peak'));
    expect(stdout).toMatch(/sample peak +−\d+\.\d\d dBFS at \d+\.\d{3} s/);
    expect(stdout).not.toMatch(/undefined|NaN|null|\[object/);
  });

  it('tells the sides of one stereo file by their low end, or takes them as said', async () => {
    const guessed = await measureCommand([both, '--json']);
    const said = await measureCommand([both, '--channel', '1:0', '--json']);
    expect(guessed.exitCode).toBe(0);
    expect(guessed.stdout).toBe(said.stdout);
  });

  it('ends with 2 and one sentence that names the file when it refuses', async () => {
    const text = await folder.bytes(
      'notes.wav',
      Uint8Array.from([...'only words in here'].map((c) => c.charCodeAt(0))),
    );
    expect(await measureCommand([kick, text])).toEqual({
      exitCode: 2,
      stdout: '',
      stderr: "notes.wav: This isn't a WAV file; export the take as WAV, 24-bit if you can.\n",
    });
    expect((await measureCommand([kick])).stderr).toMatch(/^kick\.wav: One file needs two channels/);
    expect((await measureCommand([])).exitCode).toBe(2);
  });

  it('explains itself', async () => {
    expect(await measureCommand(['--help'])).toMatchObject({
      exitCode: 0,
      stdout: expect.stringMatching(/--json/) as string,
    });
  });
});
