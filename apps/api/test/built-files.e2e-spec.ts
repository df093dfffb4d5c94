import { readdir, stat } from 'node:fs/promises';
import { join, resolve } from 'node:path';

const root = resolve(__dirname, '../../..');

/** What worker threads and the started processes load from `dist`, while specs read `src`. */
const built = ['packages/contracts', 'packages/dsp', 'packages/measure', 'apps/api'];

const isBuilt = (path: string) => path.endsWith('.ts') && !/\.spec\.ts$|(^|\/)testing\//.test(path);

async function newestSourceMs(folder: string): Promise<number> {
  const paths = (await readdir(folder, { recursive: true })).filter(isBuilt);
  const stats = await Promise.all(paths.map((path) => stat(join(folder, path))));
  return Math.max(...stats.map((each) => each.mtimeMs));
}

// The build info is written last, and written again when a source changed.
test.each(built)('%s was built after its last change; if not: npm run build', async (part) => {
  const { mtimeMs: builtAtMs } = await stat(join(root, part, 'dist/tsconfig.tsbuildinfo'));
  expect(builtAtMs).toBeGreaterThanOrEqual(await newestSourceMs(join(root, part, 'src')));
});
