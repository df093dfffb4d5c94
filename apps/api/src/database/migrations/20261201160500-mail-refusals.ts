import { Migration } from '@mikro-orm/migrations';

export class Migration20261201160500_mailRefusals extends Migration {
  override up(): void {
    this.addSql(
      `create table "mail_refusal" ("email_hash" varchar(64) not null, "choice" varchar(20) not null, "created_at" timestamptz not null, constraint "mail_refusal_pkey" primary key ("email_hash", "choice"));`,
    );
  }

  override down(): void {
    this.addSql(`drop table "mail_refusal";`);
  }
}
