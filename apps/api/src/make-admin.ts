import { MikroORM } from '@mikro-orm/postgresql';
import { AuditEvent } from './audit/entities/audit-event.entity';
import { loadConfig } from './config/config';
import { databaseConfig } from './database/database.config';
import { User } from './users/entities/user.entity';

/** `node dist/make-admin.js <mail address>`: whoever joined with it runs this installation from now on. */
async function main(email: string | undefined): Promise<void> {
  if (!email?.includes('@')) throw new Error('Say who: the address somebody joined with.');
  const orm = await MikroORM.init(databaseConfig(loadConfig().databaseUrl));
  try {
    const em = orm.em.fork();
    const user = await em.findOne(User, { emailLower: email.toLowerCase() });
    if (!user) throw new Error(`Nobody has joined with ${email}.`);
    user.roles = [...new Set([...user.roles, 'admin' as const])];
    em.create(AuditEvent, { kind: 'roles-changed', userId: null, subjectId: user.id, address: null });
    await em.flush();
    process.stdout.write(`${user.name} (${user.email}) runs this installation: /admin\n`);
  } finally {
    await orm.close();
  }
}

main(process.argv[2]).catch((error: unknown) => {
  process.stderr.write(
    `Nobody was made an admin: ${error instanceof Error ? error.message : String(error)}\n`,
  );
  process.exitCode = 1;
});
