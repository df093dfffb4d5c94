import { Migration } from '@mikro-orm/migrations';

export class Migration20261201153500_settingsOfAnAccount extends Migration {
  override up(): void {
    this.addSql(
      `alter table "user" add column "delete_after" timestamptz null, add column "digest_at" timestamptz null, add column "quota_bytes" bigint null;`,
    );
    this.addSql(`create index "user_delete_after_index" on "user" ("delete_after");`);
    this.addSql(`alter table "session" add column "user_agent" varchar(300) null;`);
    this.addSql(
      `create table "export" ("id" uuid not null, "created_at" timestamptz not null, "owner_id" uuid not null, "state" varchar(20) not null, "progress" double precision not null, "attempt" int not null default 0, "heartbeat_at" timestamptz not null, "reason" text null, "object_key" varchar(255) null, "sha256" varchar(64) null, "bytes" bigint null, "expires_at" timestamptz null, constraint "export_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "export_owner_id_index" on "export" ("owner_id");`);
    this.addSql(
      `create index "export_unfinished_index" on "export" ("state", "heartbeat_at") where "state" in ('queued', 'running');`,
    );
    this.addSql(
      `alter table "export" add constraint "export_owner_id_foreign" foreign key ("owner_id") references "user" ("id") on update cascade on delete cascade;`,
    );
  }

  override down(): void {
    this.addSql(`drop table "export";`);
    this.addSql(`alter table "session" drop column "user_agent";`);
    this.addSql(
      `alter table "user" drop column "delete_after", drop column "digest_at", drop column "quota_bytes";`,
    );
  }
}
