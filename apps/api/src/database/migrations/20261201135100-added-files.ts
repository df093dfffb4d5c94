import { Migration } from '@mikro-orm/migrations';

export class Migration20261201135100_addedFiles extends Migration {
  override up(): void {
    this.addSql(
      `create table "added_file" ("id" uuid not null, "created_at" timestamptz not null, "take_id" uuid not null, "flipped" boolean not null, "shift_ms" double precision not null, "gain_db" double precision not null, "state" varchar(20) not null, "progress" double precision not null, "attempt" int not null default 0, "heartbeat_at" timestamptz not null, "reason" text null, "object_key" varchar(255) null, "sha256" varchar(64) null, "bytes" bigint null, "frames" bigint null, "sample_rate_hz" int null, "level_db" double precision null, "true_peak_dbtp" double precision null, "listen_gain_db" double precision null, constraint "added_file_pkey" primary key ("id"));`,
    );
    this.addSql(
      `create index "added_file_unfinished_index" on "added_file" ("state", "heartbeat_at") where "state" in ('queued', 'running');`,
    );
    this.addSql(
      `alter table "added_file" add constraint "added_file_take_id_flipped_shift_ms_gain_db_unique" unique ("take_id", "flipped", "shift_ms", "gain_db");`,
    );
    this.addSql(
      `alter table "added_file" add constraint "added_file_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );
  }

  override down(): void {
    this.addSql(`drop table "added_file";`);
  }
}
