import { Migration } from '@mikro-orm/migrations';

export class Migration20261201120050_tryOuts extends Migration {
  override up(): void {
    this.addSql(
      `create table "try_out" ("id" uuid not null, "created_at" timestamptz not null, "owner_id" uuid not null, "subject" varchar(40) not null, "differs" varchar(80) not null, "unit" varchar(10) not null, "reason" text not null default '', "winner_place_id" uuid null, "current_place_id" uuid null, constraint "try_out_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "try_out_owner_id_index" on "try_out" ("owner_id");`);
    this.addSql(
      `create table "try_out_place" ("id" uuid not null, "created_at" timestamptz not null, "try_out_id" uuid not null, "upload_key" uuid not null, "rank" smallint not null, "file_names" jsonb not null, "position" double precision null, "label" varchar(40) not null, constraint "try_out_place_pkey" primary key ("id"));`,
    );
    this.addSql(
      `alter table "try_out_place" add constraint "try_out_place_try_out_id_upload_key_unique" unique ("try_out_id", "upload_key");`,
    );

    this.addSql(
      `alter table "try_out" add constraint "try_out_owner_id_foreign" foreign key ("owner_id") references "user" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "try_out_place" add constraint "try_out_place_try_out_id_foreign" foreign key ("try_out_id") references "try_out" ("id") on update cascade on delete cascade;`,
    );
  }

  override down(): void {
    this.addSql(`drop table if exists "try_out_place" cascade;`);
    this.addSql(`drop table if exists "try_out" cascade;`);
  }
}
