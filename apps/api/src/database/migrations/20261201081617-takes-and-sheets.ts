import { Migration } from '@mikro-orm/migrations';

export class Migration20261201081617_takesAndSheets extends Migration {
  override up(): void {
    this.addSql(
      `create table "audit_event" ("id" uuid not null, "created_at" timestamptz not null, "kind" varchar(40) not null, "user_id" uuid null, "subject_id" uuid null, "address" varchar(64) null, constraint "audit_event_pkey" primary key ("id"));`,
    );
    this.addSql(
      `create index "audit_event_user_id_created_at_index" on "audit_event" ("user_id", "created_at");`,
    );

    this.addSql(
      `create table "throttle" ("key" varchar(120) not null, "window_start" timestamptz not null, "count" int not null, constraint "throttle_pkey" primary key ("key", "window_start"));`,
    );
    this.addSql(`create index "throttle_window_start_index" on "throttle" ("window_start");`);

    this.addSql(
      `create table "user" ("id" uuid not null, "created_at" timestamptz not null, "name" varchar(60) not null, "email" varchar(254) not null, "email_lower" varchar(254) not null, "password_hash" text not null, "roles" text[] not null, "settings" jsonb not null, "next_take_number" int not null default 1, "locked_at" timestamptz null, constraint "user_pkey" primary key ("id"));`,
    );
    this.addSql(`alter table "user" add constraint "user_email_lower_unique" unique ("email_lower");`);

    this.addSql(
      `create table "take" ("id" uuid not null, "created_at" timestamptz not null, "owner_id" uuid not null, "number" int not null, "title" varchar(120) not null, "note" text not null, "recorded_at" timestamptz not null, "upload_key" uuid not null, "ticked_actions" jsonb not null, "current_report_id" uuid null, "deleted_at" timestamptz null, constraint "take_pkey" primary key ("id"));`,
    );
    this.addSql(
      `create index "take_newest_first_index" on "take" ("owner_id", "recorded_at" desc, "id" desc) where "deleted_at" is null;`,
    );
    this.addSql(
      `alter table "take" add constraint "take_owner_id_upload_key_unique" unique ("owner_id", "upload_key");`,
    );
    this.addSql(
      `alter table "take" add constraint "take_owner_id_number_unique" unique ("owner_id", "number");`,
    );

    this.addSql(
      `create table "take_file" ("id" uuid not null, "created_at" timestamptz not null, "take_id" uuid not null, "position" smallint not null, "name" varchar(255) not null, "object_key" varchar(255) not null, "sha256" varchar(64) not null, "bytes" bigint not null, "encoding" varchar(60) not null, "data_offset" bigint not null, "block_align" int not null, "frames" bigint not null, "channels" int not null, "sample_rate_hz" int not null, "cut_short" boolean not null, constraint "take_file_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "take_file_take_id_index" on "take_file" ("take_id");`);
    this.addSql(
      `alter table "take_file" add constraint "take_file_object_key_unique" unique ("object_key");`,
    );

    this.addSql(
      `create table "take_track" ("id" uuid not null, "created_at" timestamptz not null, "take_id" uuid not null, "file_id" uuid not null, "position" smallint not null, "channel" smallint not null, "role" varchar(40) not null, constraint "take_track_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "take_track_take_id_index" on "take_track" ("take_id");`);
    this.addSql(
      `alter table "take_track" add constraint "take_track_file_id_channel_unique" unique ("file_id", "channel");`,
    );

    this.addSql(
      `create table "measurement" ("id" uuid not null, "created_at" timestamptz not null, "take_id" uuid not null, "dsp_version" varchar(40) not null, "input_hash" varchar(64) not null, "state" varchar(20) not null, "stage" varchar(40) null, "progress" double precision not null, "attempt" int not null default 0, "heartbeat_at" timestamptz not null, "reason" text null, constraint "measurement_pkey" primary key ("id"));`,
    );
    this.addSql(
      `create index "measurement_unfinished_index" on "measurement" ("state", "heartbeat_at") where "state" in ('queued', 'running');`,
    );
    this.addSql(
      `alter table "measurement" add constraint "measurement_take_id_dsp_version_input_hash_unique" unique ("take_id", "dsp_version", "input_hash");`,
    );

    this.addSql(
      `create table "report" ("measurement_id" uuid not null, "take_id" uuid not null, "created_at" timestamptz not null, "kick_peak_dbfs" double precision null, "kick_clipped" boolean not null, "overhead_peak_dbfs" double precision null, "overhead_clipped" boolean not null, "low_end_db" double precision null, "flip_gain_db" double precision null, "verdict" varchar(20) not null, "summary" jsonb not null, "hits" jsonb not null, "clip_runs" jsonb not null, constraint "report_pkey" primary key ("measurement_id"));`,
    );
    this.addSql(`create index "report_take_id_index" on "report" ("take_id");`);

    this.addSql(
      `create table "pair_spectrum" ("report_id" uuid not null, "track_a" smallint not null, "track_b" smallint not null, "bin_hz" double precision not null, "bin_count" int not null, "hit_count" int not null, "data" bytea not null, constraint "pair_spectrum_pkey" primary key ("report_id", "track_a", "track_b"));`,
    );

    this.addSql(
      `create table "session" ("id" uuid not null, "created_at" timestamptz not null, "user_id" uuid not null, "refresh_seed" varchar(64) not null, "generation" int not null default 0, "rotated_at" timestamptz not null, "expires_at" timestamptz not null, "revoked_at" timestamptz null, "stay" boolean not null, constraint "session_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "session_user_id_index" on "session" ("user_id");`);

    this.addSql(
      `alter table "take" add constraint "take_owner_id_foreign" foreign key ("owner_id") references "user" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "take_file" add constraint "take_file_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "take_track" add constraint "take_track_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "take_track" add constraint "take_track_file_id_foreign" foreign key ("file_id") references "take_file" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "measurement" add constraint "measurement_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "report" add constraint "report_measurement_id_foreign" foreign key ("measurement_id") references "measurement" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "report" add constraint "report_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "pair_spectrum" add constraint "pair_spectrum_report_id_foreign" foreign key ("report_id") references "report" ("measurement_id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "session" add constraint "session_user_id_foreign" foreign key ("user_id") references "user" ("id") on update cascade on delete cascade;`,
    );
  }

  override down(): void {
    this.addSql(`alter table "take" drop constraint "take_owner_id_foreign";`);

    this.addSql(`alter table "session" drop constraint "session_user_id_foreign";`);

    this.addSql(`alter table "take_file" drop constraint "take_file_take_id_foreign";`);

    this.addSql(`alter table "take_track" drop constraint "take_track_take_id_foreign";`);

    this.addSql(`alter table "measurement" drop constraint "measurement_take_id_foreign";`);

    this.addSql(`alter table "report" drop constraint "report_take_id_foreign";`);

    this.addSql(`alter table "take_track" drop constraint "take_track_file_id_foreign";`);

    this.addSql(`alter table "report" drop constraint "report_measurement_id_foreign";`);

    this.addSql(`alter table "pair_spectrum" drop constraint "pair_spectrum_report_id_foreign";`);

    this.addSql(`drop table if exists "audit_event" cascade;`);

    this.addSql(`drop table if exists "throttle" cascade;`);

    this.addSql(`drop table if exists "user" cascade;`);

    this.addSql(`drop table if exists "take" cascade;`);

    this.addSql(`drop table if exists "take_file" cascade;`);

    this.addSql(`drop table if exists "take_track" cascade;`);

    this.addSql(`drop table if exists "measurement" cascade;`);

    this.addSql(`drop table if exists "report" cascade;`);

    this.addSql(`drop table if exists "pair_spectrum" cascade;`);

    this.addSql(`drop table if exists "session" cascade;`);
  }
}
