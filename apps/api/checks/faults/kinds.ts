import { closeSync, openSync, rmSync, writeSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as delay } from 'node:timers/promises';
import { paths } from '@thudline/contracts';
import { Random } from '@thudline/fixtures';
import { between } from '../lib/random';
import { Session } from '../lib/session';
import { System } from './system';

export interface FaultContext {
  system: System;
  random: Random;
  player: Session;
  /** Where the player's mails go. */
  playerEmail: string;
  /** Addresses that were promised a mail. */
  promisedMails: string[];
}

export interface FaultKind {
  name: string;
  /** Does the harm, lets it last for a moment, and ends it. */
  strike(context: FaultContext): Promise<void>;
}

const lasts = (random: Random) => delay(between(random, 100, 1_500));

export const faultKinds: readonly FaultKind[] = [
  {
    name: 'worker killed',
    async strike({ system: { worker }, random }) {
      await worker.stop('SIGKILL');
      await lasts(random);
      worker.start();
    },
  },
  {
    name: 'API killed',
    async strike({ system: { api }, random }) {
      await api.stop('SIGKILL');
      await lasts(random);
      api.start();
    },
  },
  {
    name: 'PostgreSQL stopped at once',
    async strike({ system: { database }, random }) {
      await database.stopAtOnce();
      await lasts(random);
      await database.start();
    },
  },
  {
    name: 'object store killed',
    async strike({ system: { store }, random }) {
      await store.stop('SIGKILL');
      await lasts(random);
      store.start();
    },
  },
  {
    name: 'disk of the store full',
    async strike({ system, random }) {
      if (!system.hasOwnDisk) return;
      const filler = join(system.storeDir, 'filler');
      fill(filler);
      await lasts(random);
      rmSync(filler);
    },
  },
  {
    name: 'line cut in mid-upload',
    strike({ system: { line } }) {
      line.cut();
      return Promise.resolve();
    },
  },
  {
    name: 'jobs delivered twice',
    async strike({ system: { database } }) {
      await database.query(
        `insert into pgboss.job (name, data)
         select 'measure', jsonb_build_object('measurementId', id)
         from (select id from measurement order by id desc limit 5) newest, generate_series(1, 2)`,
      );
    },
  },
  {
    name: 'SMTP refuses',
    async strike({ system: { mail }, random, player, playerEmail, promisedMails }) {
      await mail.close();
      const { status } = await player.post(paths.forgot, { email: playerEmail });
      if (status < 300) promisedMails.push(playerEmail);
      await lasts(random);
      await mail.open();
    },
  },
];

const blockBytes = 1 << 20;

function fill(path: string): void {
  const file = openSync(path, 'w');
  try {
    for (let size = blockBytes; size >= 512; size /= 2) {
      const block = Buffer.alloc(size);
      try {
        for (;;) writeSync(file, block);
      } catch {
        // Full for blocks of this size; smaller ones may still fit.
      }
    }
  } finally {
    closeSync(file);
  }
}
