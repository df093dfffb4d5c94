import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import * as dsp from './index';
import { documentedFunctions, exampleSteps } from './testing/docExamples';

const textOf = (name: string): string => readFileSync(join(__dirname, name), 'utf8');
const [, readme] = /```js\n([\s\S]*?)```/.exec(textOf('../README.md')) ?? [];
const documented = new Map(
  readdirSync(__dirname, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.ts') && !/\.spec\.ts$|testing\//.test(name))
    .flatMap((name) => documentedFunctions(textOf(name)))
    .map((found) => [found.name, found]),
);
const functions = Object.entries(dsp as Record<string, unknown>)
  .filter(([, value]) => typeof value === 'function' && !/^class\b/.test(String(value)))
  .map(([name]) => name);

interface Told {
  readonly given: unknown;
  readonly expected: unknown;
}

/** Runs code as it stands, with all that the package offers in reach, and what it is given. @returns what it returns */
function run(code: string, given: Record<string, unknown> = {}): Promise<Record<string, unknown>> {
  const reach = { ...dsp, ...given };
  // eslint-disable-next-line @typescript-eslint/no-implied-eval -- the examples are our own text, and running them is what this is for
  const made = new Function(...Object.keys(reach), `return (async () => { ${code} })();`) as (
    ...values: unknown[]
  ) => ReturnType<typeof run>;
  return made(...Object.values(reach));
}

/** What the README makes and the examples use. */
const shared = 'file, facts, spectrum, figures, target, reader';
const fromReadme = run(`const told = []; ${telling(readme)} return { told, ${shared} };`);

async function told(example: string): Promise<Told[]> {
  const code = `const told = []; ${telling(example)} return { told };`;
  return (await run(code, await fromReadme)).told as Told[];
}

function telling(example: string): string {
  return exampleSteps(example)
    .map(({ code, expected }) =>
      expected === null ? code : `told.push({ given: ${code.replace(/;$/, '')}, expected: (${expected}) });`,
    )
    .join('\n');
}

/** As many decimals as the example prints: `4.77` stands for 4.765 up to 4.775. */
function asPrinted(given: unknown, expected: unknown): unknown {
  if (typeof given === 'number' && typeof expected === 'number') {
    const decimals = String(expected).split('.')[1]?.length ?? 0;
    return Number(given.toFixed(decimals));
  }
  if (Array.isArray(given) && Array.isArray(expected))
    return given.map((value, index) => asPrinted(value, expected[index]));
  return given;
}

describe('what the package offers', () => {
  it('is a good number of functions', () => expect(functions.length).toBeGreaterThan(50));

  it.each(functions)('%s says what it gives, and shows it', async (name) => {
    const { text, example } = documented.get(name) ?? { text: '', example: '' };
    expect(text.length).toBeGreaterThan(20);
    const lines = await told(example);
    expect(lines.length).toBeGreaterThan(0);
    for (const { given, expected } of lines) expect(asPrinted(given, expected)).toEqual(expected);
  });

  it('is what the README shows', async () => {
    const lines = (await fromReadme).told as Told[];
    expect(lines).toHaveLength(3);
    for (const { given, expected } of lines) expect(asPrinted(given, expected)).toEqual(expected);
  });
});
