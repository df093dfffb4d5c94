import { availableParallelism } from 'node:os';
import { uploadLimits } from '@thudline/contracts';
import { z } from 'zod';

const flag = z.enum(['true', 'false']).transform((text) => text === 'true');
const count = z.coerce.number().int().positive();

const environment = z.object({
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  S3_ENDPOINT: z.url().optional(),
  S3_REGION: z.string().min(1).default('us-east-1'),
  S3_BUCKET: z.string().min(3),
  S3_ACCESS_KEY: z.string().min(1),
  S3_SECRET_KEY: z.string().min(1),
  S3_FORCE_PATH_STYLE: flag.default(false),
  S3_CHECKSUMS: z.enum(['when-required', 'sdk-default']).default('sdk-default'),
  JWT_SECRET: z.string().min(32, 'needs at least 32 characters'),
  PUBLIC_URL: z.url({ protocol: /^https?$/ }),
  PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
  HOST: z.string().min(1).default('127.0.0.1'),
  SCRATCH_DIR: z.string().min(1),
  WEB_DIST: z.string().min(1).optional(),
  /** What Express calls `trust proxy`: a number of hops, `true`, `false`, or addresses. */
  TRUST_PROXY: z.string().default('false').transform(trustProxy),
  /** OWASP's least setting for argon2id: 19 MiB, 2 passes, 1 lane (Password Storage Cheat Sheet). */
  ARGON2_MEMORY_KIB: z.coerce.number().int().min(1024).default(19_456),
  ARGON2_TIME: z.coerce.number().int().min(1).default(2),
  MAX_FILE_BYTES: count.default(uploadLimits.maxFileBytes),
  MEASURE_THREADS: count.default(Math.max(1, availableParallelism() - 1)),
  HEARTBEAT_MS: count.default(5_000),
  SILENT_AFTER_MS: count.default(30_000),
  /** Failed sign-ins in a quarter of an hour, and joins in an hour; common practice, no source. */
  SIGN_IN_LIMIT_PER_ACCOUNT: count.default(10),
  SIGN_IN_LIMIT_PER_ADDRESS: count.default(100),
  JOIN_LIMIT_PER_ADDRESS: count.default(100),
  /** Requests of guests in a quarter of an hour: a sheet takes about ten, playing it some dozens more. */
  GUEST_READ_LIMIT_PER_ADDRESS: count.default(3_000),
  /** Links opened in a quarter of an hour; common practice, no source. */
  OPEN_LINK_LIMIT_PER_ADDRESS: count.default(120),
  /** Tries of a link's passphrase from one address in a quarter of an hour, and from all in a day: common practice, no source. */
  PASSPHRASE_LIMIT_PER_ADDRESS: count.default(10),
  PASSPHRASE_LIMIT_PER_LINK: count.default(500),
  /** Notes in an hour of one account and through one link, and in a quarter of an hour of one guest's address; common practice, no source. */
  NOTE_LIMIT_PER_ACCOUNT: count.default(120),
  GUEST_NOTE_LIMIT_PER_LINK: count.default(60),
  GUEST_NOTE_LIMIT_PER_ADDRESS: count.default(10),
  COMPLAINT_LIMIT_PER_ADDRESS: count.default(10),
  /** Mails and phone links in an hour for one account, mails asked for by one address; common practice, no source. */
  MAIL_LIMIT_PER_ACCOUNT: count.default(5),
  MAIL_LIMIT_PER_ADDRESS: count.default(30),
  PHONE_LINK_LIMIT_PER_ACCOUNT: count.default(30),
  /** Links mailed in a day for one account; common practice, no source. */
  SHARE_MAIL_LIMIT_PER_ACCOUNT: count.default(20),
  /** Without one no mail is sent, and the log says so. */
  SMTP_URL: z.url({ protocol: /^smtps?$/ }).optional(),
  MAIL_FROM: z.string().min(3).optional(),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
});

function trustProxy(text: string): boolean | number | string {
  if (text === 'true' || text === 'false') return text === 'true';
  return /^\d+$/.test(text) ? Number(text) : text;
}

function grouped(env: z.output<typeof environment>) {
  return {
    databaseUrl: env.DATABASE_URL,
    objectStore: {
      endpoint: env.S3_ENDPOINT,
      region: env.S3_REGION,
      bucket: env.S3_BUCKET,
      accessKey: env.S3_ACCESS_KEY,
      secretKey: env.S3_SECRET_KEY,
      forcePathStyle: env.S3_FORCE_PATH_STYLE,
      checksums: env.S3_CHECKSUMS,
    },
    jwtSecret: env.JWT_SECRET,
    publicUrl: env.PUBLIC_URL,
    publicOrigin: new URL(env.PUBLIC_URL).origin,
    isHttps: env.PUBLIC_URL.startsWith('https:'),
    port: env.PORT,
    host: env.HOST,
    trustProxy: env.TRUST_PROXY,
    scratchDir: env.SCRATCH_DIR,
    webDist: env.WEB_DIST,
    argon2: { memoryKib: env.ARGON2_MEMORY_KIB, passes: env.ARGON2_TIME },
    maxFileBytes: env.MAX_FILE_BYTES,
    measuring: {
      threads: env.MEASURE_THREADS,
      heartbeatMs: env.HEARTBEAT_MS,
      silentAfterMs: env.SILENT_AFTER_MS,
    },
    limits: {
      signInPerAccount: env.SIGN_IN_LIMIT_PER_ACCOUNT,
      signInPerAddress: env.SIGN_IN_LIMIT_PER_ADDRESS,
      joinPerAddress: env.JOIN_LIMIT_PER_ADDRESS,
      phoneLinksPerAccount: env.PHONE_LINK_LIMIT_PER_ACCOUNT,
      mailsPerAccount: env.MAIL_LIMIT_PER_ACCOUNT,
      mailsPerAddress: env.MAIL_LIMIT_PER_ADDRESS,
      guestReadsPerAddress: env.GUEST_READ_LIMIT_PER_ADDRESS,
      openLinkPerAddress: env.OPEN_LINK_LIMIT_PER_ADDRESS,
      passphrasePerAddress: env.PASSPHRASE_LIMIT_PER_ADDRESS,
      passphrasePerLink: env.PASSPHRASE_LIMIT_PER_LINK,
      notesPerAccount: env.NOTE_LIMIT_PER_ACCOUNT,
      guestNotesPerLink: env.GUEST_NOTE_LIMIT_PER_LINK,
      guestNotesPerAddress: env.GUEST_NOTE_LIMIT_PER_ADDRESS,
      complaintsPerAddress: env.COMPLAINT_LIMIT_PER_ADDRESS,
      shareMailsPerAccount: env.SHARE_MAIL_LIMIT_PER_ACCOUNT,
    },
    mail: {
      smtpUrl: env.SMTP_URL,
      from: env.MAIL_FROM ?? `Thudline <no-reply@${new URL(env.PUBLIC_URL).hostname}>`,
    },
    logLevel: env.LOG_LEVEL,
  };
}

export type Config = ReturnType<typeof grouped>;

/** The only reader of the environment. Says every wrong setting at once, never a value. */
export function loadConfig(env: NodeJS.ProcessEnv = process.env): Config {
  const parsed = environment.safeParse(env);
  if (parsed.success) return grouped(parsed.data);
  const problems = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`Settings are missing or wrong. ${problems.join('; ')}`);
}
