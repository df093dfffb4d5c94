import { mkdir, readdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { type KeptMessage } from './keptMessage';

export interface Mailbox {
  add(message: KeptMessage): Promise<void>;
  /** Newest first; all of them, or those to one address. */
  list(to?: string): KeptMessage[];
  find(id: string): KeptMessage | undefined;
}

/** A bound, so that a mailbox nobody empties stays small; common practice, no source. */
const keptMessages = 500;

/**
 * Mails of this machine: in memory, and one file each in a folder, so that they outlive a restart.
 *
 * @throws {Error} the folder can't be written, or holds a file that isn't ours
 */
export async function openMailbox(directory: string): Promise<Mailbox> {
  await mkdir(directory, { recursive: true, mode: 0o700 });
  const fileOf = (id: string) => join(directory, `${id}.json`);
  const messages = await readAll(directory);

  async function add(message: KeptMessage): Promise<void> {
    // Written beside and renamed: a mail holds a sign-in link, so only its owner may read it, and never half of it.
    const beside = `${fileOf(message.id)}.new`;
    await writeFile(beside, JSON.stringify(message), { mode: 0o600 });
    await rename(beside, fileOf(message.id));
    messages.unshift(message);
    const dropped = messages.splice(keptMessages);
    await Promise.all(dropped.map(({ id }) => rm(fileOf(id), { force: true })));
  }

  return {
    add,
    list: (to) => (to ? messages.filter((message) => message.to.includes(to.toLowerCase())) : [...messages]),
    find: (id) => messages.find((message) => message.id === id),
  };
}

async function readAll(directory: string): Promise<KeptMessage[]> {
  const names = (await readdir(directory)).filter((name) => name.endsWith('.json'));
  const newestFirst = names.sort().reverse();
  return Promise.all(
    newestFirst.map(async (name) => JSON.parse(await readFile(join(directory, name), 'utf8')) as KeptMessage),
  );
}
