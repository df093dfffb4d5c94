import { readdirSync, statSync } from 'node:fs';
import { join, resolve } from 'node:path';

const root = resolve(__dirname, '../../../..');
const projects = ['packages/contracts', 'packages/dsp', 'packages/measure', 'apps/api'];

/** Worker processes run what was built: an old build would test yesterday's code and pass. */
export function requireFreshBuild(): void {
  for (const project of projects) {
    const built = statSync(join(root, project, 'dist/tsconfig.tsbuildinfo'), { throwIfNoEntry: false });
    const newest = newestSource(join(root, project, 'src'));
    if (!built || built.mtimeMs < newest.mtimeMs) {
      throw new Error(`${project}/dist is older than ${newest.path}: run npx tsc -b apps/api first`);
    }
  }
}

function newestSource(folder: string): { path: string; mtimeMs: number } {
  const sources = readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((name) => /\.ts$/.test(name) && !/\.(e2e-)?spec\.ts$/.test(name))
    .map((name) => ({ path: join(folder, name), mtimeMs: statSync(join(folder, name)).mtimeMs }));
  return sources.reduce((newest, source) => (source.mtimeMs > newest.mtimeMs ? source : newest));
}
