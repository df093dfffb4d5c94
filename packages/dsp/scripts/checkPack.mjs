/**
 * Packs this package as `npm pack` does, puts it into an empty project with its one dependency, and uses it there: the
 * README's example with plain Node, and its types with a strict compiler. Needs `dist`.
 */
import { execFileSync } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const here = dirname(dirname(fileURLToPath(import.meta.url)));
const require = createRequire(join(here, 'package.json'));
const project = mkdtempSync(join(tmpdir(), 'thudline-pack-'));
const run = (command, args, cwd) =>
  execFileSync(command, args, { cwd, encoding: 'utf8', stdio: ['ignore', 'pipe', 'inherit'] });

try {
  const [{ filename, files, size }] = JSON.parse(
    run('npm', ['pack', '--json', '--silent', '--pack-destination', project], here),
  );
  const astray = files.map(({ path }) => path).filter((path) => /\.spec\.|testing\/|tsbuildinfo/.test(path));
  if (astray.length > 0) throw new Error(`These don't belong into the package: ${astray.join(', ')}`);

  const installed = join(project, 'node_modules/@thudline/dsp');
  mkdirSync(installed, { recursive: true });
  run('tar', ['-xzf', join(project, filename), '--strip-components=1', '-C', installed], project);
  cpSync(dirname(require.resolve('fft.js/package.json')), join(project, 'node_modules/fft.js'), {
    recursive: true,
  });

  const [, example] = /```js\n([\s\S]*?)```/.exec(readFileSync(join(here, 'README.md'), 'utf8'));
  const names = 'bytesSource, encodeWav, measureTake, openWav, reportFigures, reportLine';
  writeFileSync(join(project, 'package.json'), '{ "type": "module" }');
  writeFileSync(
    join(project, 'example.mjs'),
    `import { ${names} } from '@thudline/dsp';\n${example}\nconsole.log(reportLine(figures, reader)[0].action);\n`,
  );
  const said = run(process.execPath, ['example.mjs'], project).trim();
  if (said !== 'Flip the overhead:') throw new Error(`The README's example says: ${said}`);

  writeFileSync(
    join(project, 'types.mts'),
    [
      `import { createTruePeak, type TakeFacts } from '@thudline/dsp';`,
      `const peak: number | null = createTruePeak({ sampleRateHz: 48000 }).result().truePeakDbtp;`,
      `export const hits = (facts: TakeFacts): number => facts.hits.length + (peak ?? 0);`,
    ].join('\n'),
  );
  const compiler = require.resolve('typescript/bin/tsc');
  const options = ['--noEmit', '--strict', '--target', 'es2022', '--module', 'node16', 'types.mts'];
  run(process.execPath, [compiler, ...options], project);
  console.log(`${filename}: ${files.length} files, ${Math.round(size / 1024)} kB; example and types work`);
} finally {
  rmSync(project, { recursive: true, force: true });
}
