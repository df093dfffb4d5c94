import { Migration } from '@mikro-orm/migrations';

export class Migration20261201091810_shares extends Migration {
  override up(): void {
    this.addSql(
      `create table "share" ("id" uuid not null, "created_at" timestamptz not null, "owner_id" uuid not null, "take_id" uuid not null, "token_hash" varchar(64) not null, "question" varchar(300) not null, "can_listen" boolean not null, "can_download" boolean not null, "expires_at" timestamptz null, "revoked_at" timestamptz null, "opened_at" timestamptz null, "open_count" int not null default 0, constraint "share_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "share_owner_id_index" on "share" ("owner_id");`);
    this.addSql(`create index "share_take_id_index" on "share" ("take_id");`);
    this.addSql(`alter table "share" add constraint "share_token_hash_unique" unique ("token_hash");`);

    this.addSql(
      `alter table "share" add constraint "share_owner_id_foreign" foreign key ("owner_id") references "user" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "share" add constraint "share_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );
  }

  override down(): void {
    this.addSql(`drop table if exists "share" cascade;`);
  }
}
