import { Migration } from '@mikro-orm/migrations';

/** Rooms, their logs of changes, and where each take was recorded. */
export class Migration20261201134300_rooms extends Migration {
  override up(): void {
    this.addSql(
      `create table "room" ("id" uuid not null, "created_at" timestamptz not null, "owner_id" uuid not null, "name" varchar(60) not null, "shape" jsonb not null, "surfaces" jsonb not null, "temperature_c" double precision null, "kit" jsonb null, constraint "room_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "room_owner_id_index" on "room" ("owner_id");`);

    this.addSql(
      `create table "room_change" ("id" uuid not null, "created_at" timestamptz not null, "room_id" uuid not null, "happened_on" date not null, "rank" int not null default 0, "what" varchar(120) not null, "category" varchar(20) not null, "place" jsonb null, "cost" varchar(40) not null, "note" text not null, constraint "room_change_pkey" primary key ("id"));`,
    );
    this.addSql(
      `create index "room_change_room_id_happened_on_rank_id_index" on "room_change" ("room_id", "happened_on", "rank", "id");`,
    );

    this.addSql(
      `create table "room_change_take" ("change_id" uuid not null, "take_id" uuid not null, "side" varchar(10) not null, constraint "room_change_take_pkey" primary key ("change_id", "take_id"));`,
    );
    this.addSql(`create index "room_change_take_take_id_index" on "room_change_take" ("take_id");`);

    this.addSql(
      `alter table "room" add constraint "room_owner_id_foreign" foreign key ("owner_id") references "user" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "room_change" add constraint "room_change_room_id_foreign" foreign key ("room_id") references "room" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "room_change_take" add constraint "room_change_take_change_id_foreign" foreign key ("change_id") references "room_change" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "room_change_take" add constraint "room_change_take_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(`alter table "take" add column "room_id" uuid null;`);
    this.addSql(
      `alter table "take" add constraint "take_room_id_foreign" foreign key ("room_id") references "room" ("id") on update cascade on delete set null;`,
    );
    this.addSql(`create index "take_room_id_recorded_at_index" on "take" ("room_id", "recorded_at");`);
  }

  override down(): void {
    this.addSql(`alter table "take" drop constraint "take_room_id_foreign";`);

    this.addSql(`alter table "room_change" drop constraint "room_change_room_id_foreign";`);

    this.addSql(`alter table "room_change_take" drop constraint "room_change_take_change_id_foreign";`);

    this.addSql(`drop table if exists "room" cascade;`);

    this.addSql(`drop table if exists "room_change" cascade;`);

    this.addSql(`drop table if exists "room_change_take" cascade;`);

    this.addSql(`drop index "take_room_id_recorded_at_index";`);
    this.addSql(`alter table "take" drop column "room_id";`);
  }
}
