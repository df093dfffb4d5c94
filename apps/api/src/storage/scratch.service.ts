import { mkdir, mkdtemp, readdir, rm, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';

/** What belongs to nobody any more: longer than any upload or measurement takes (common practice, no source). */
const abandonedAfterMs = 6 * 60 * 60 * 1000;

/** Short-lived files of one upload or one measurement. API and worker of one machine may share the folder. */
@Injectable()
export class ScratchService {
  private readonly root: string;

  constructor(@Inject(CONFIG) config: Config) {
    this.root = config.scratchDir;
  }

  /** @returns a new folder named `<purpose>-<owner's process id>-…`; whoever made it removes it */
  async make(purpose: 'upload' | 'measuring'): Promise<string> {
    await mkdir(this.root, { recursive: true });
    return mkdtemp(join(this.root, `${purpose}-${process.pid}-`));
  }

  async remove(folder: string): Promise<void> {
    await rm(folder, { recursive: true, force: true });
  }

  /** Removes what dead processes left; called at start, when this process has made nothing yet. */
  async sweep(): Promise<void> {
    await mkdir(this.root, { recursive: true });
    for (const name of await readdir(this.root)) {
      const owner = /^(?:upload|measuring)-(\d+)-/.exec(name)?.[1];
      if (owner && (await isAbandoned(join(this.root, name), Number(owner))))
        await this.remove(join(this.root, name));
    }
  }
}

async function isAbandoned(folder: string, processId: number): Promise<boolean> {
  if (processId === process.pid || !isRunning(processId)) return true;
  const found = await stat(folder).catch(() => null);
  return found !== null && Date.now() - found.mtimeMs > abandonedAfterMs;
}

function isRunning(processId: number): boolean {
  try {
    process.kill(processId, 0);
    return true;
  } catch {
    return false;
  }
}
