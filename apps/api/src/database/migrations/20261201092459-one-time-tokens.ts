import { Migration } from '@mikro-orm/migrations';

export class Migration20261201092459_oneTimeTokens extends Migration {
  override up(): void {
    this.addSql(
      `create table "one_time_token" ("id" uuid not null, "created_at" timestamptz not null, "kind" varchar(20) not null, "hash" varchar(64) not null, "user_id" uuid not null, "email" varchar(254) not null, "expires_at" timestamptz not null, "used_at" timestamptz null, constraint "one_time_token_pkey" primary key ("id"));`,
    );
    this.addSql(`alter table "one_time_token" add constraint "one_time_token_hash_unique" unique ("hash");`);
    this.addSql(`create index "one_time_token_user_id_index" on "one_time_token" ("user_id");`);
    this.addSql(`create index "one_time_token_expires_at_index" on "one_time_token" ("expires_at");`);

    this.addSql(
      `alter table "one_time_token" add constraint "one_time_token_user_id_foreign" foreign key ("user_id") references "user" ("id") on update cascade on delete cascade;`,
    );
  }

  override down(): void {
    this.addSql(`drop table if exists "one_time_token" cascade;`);
  }
}
