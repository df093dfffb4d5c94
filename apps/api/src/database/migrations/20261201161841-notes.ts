import { Migration } from '@mikro-orm/migrations';

/** Notes on sheets, what they ask for, who has read them, and complaints; the database tells of notes, see tell-of-changes. */
export class Migration20261201161841_notes extends Migration {
  override up(): void {
    this.addSql(
      `create table "read_mark" ("user_id" uuid not null, "take_id" uuid not null, "read_at" timestamptz not null, constraint "read_mark_pkey" primary key ("user_id", "take_id"));`,
    );
    this.addSql(`create index "read_mark_take_id_index" on "read_mark" ("take_id");`);

    this.addSql(
      `create table "note" ("id" uuid not null, "created_at" timestamptz not null, "take_id" uuid not null, "parent_id" uuid null, "author_id" uuid null, "share_id" uuid null, "guest_id" uuid null, "guest_name" varchar(60) null, "pin_kind" varchar(10) not null, "pin_time_s" double precision null, "finding_topic" varchar(30) null, "body" text not null, "edited_at" timestamptz null, "deleted_at" timestamptz null, "removed_by" varchar(10) null, constraint "note_pkey" primary key ("id"), constraint note_one_pin_check check (num_nonnulls(pin_time_s, finding_topic) <= 1), constraint note_pin_topic_check check ((finding_topic is not null) = (pin_kind = 'finding')), constraint note_one_writer_check check (author_id is null or guest_id is null));`,
    );
    this.addSql(`create index "note_parent_id_index" on "note" ("parent_id");`);
    this.addSql(`create index "note_author_id_index" on "note" ("author_id");`);
    this.addSql(`create index "note_share_id_index" on "note" ("share_id");`);
    this.addSql(`create index "note_take_id_id_index" on "note" ("take_id", "id");`);

    this.addSql(
      `create table "next_item" ("id" uuid not null, "created_at" timestamptz not null, "note_id" uuid not null, "text" varchar(160) not null, "rank" int not null, "done_at" timestamptz null, constraint "next_item_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "next_item_note_id_index" on "next_item" ("note_id");`);

    this.addSql(
      `create table "complaint" ("id" uuid not null, "created_at" timestamptz not null, "take_id" uuid not null, "note_id" uuid null, "reporter_id" uuid null, "reason" text not null, "settled_at" timestamptz null, constraint "complaint_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "complaint_take_id_index" on "complaint" ("take_id");`);
    this.addSql(`create index "complaint_note_id_index" on "complaint" ("note_id");`);
    this.addSql(`create index "complaint_reporter_id_index" on "complaint" ("reporter_id");`);

    this.addSql(
      `alter table "read_mark" add constraint "read_mark_user_id_foreign" foreign key ("user_id") references "user" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "read_mark" add constraint "read_mark_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "note" add constraint "note_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "note" add constraint "note_parent_id_foreign" foreign key ("parent_id") references "note" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "note" add constraint "note_author_id_foreign" foreign key ("author_id") references "user" ("id") on update cascade on delete set null;`,
    );
    this.addSql(
      `alter table "note" add constraint "note_share_id_foreign" foreign key ("share_id") references "share" ("id") on update cascade on delete set null;`,
    );

    this.addSql(
      `alter table "next_item" add constraint "next_item_note_id_foreign" foreign key ("note_id") references "note" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "complaint" add constraint "complaint_take_id_foreign" foreign key ("take_id") references "take" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "complaint" add constraint "complaint_note_id_foreign" foreign key ("note_id") references "note" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "complaint" add constraint "complaint_reporter_id_foreign" foreign key ("reporter_id") references "user" ("id") on update cascade on delete set null;`,
    );

    this.addSql(`
      create function "tell_of_notes"() returns trigger language plpgsql as $$
      begin
        perform pg_notify('thudline_notes', new."take_id"::text);
        return null;
      end $$;`);
    this.addSql(`
      create trigger "note_changed" after insert or update on "note" for each row
      execute function "tell_of_notes"();`);
    this.addSql(`
      create function "tell_of_next_item"() returns trigger language plpgsql as $$
      begin
        perform pg_notify('thudline_notes', note."take_id"::text) from "note" where note."id" = new."note_id";
        return null;
      end $$;`);
    this.addSql(`
      create trigger "next_item_changed" after insert or update on "next_item" for each row
      execute function "tell_of_next_item"();`);
  }

  override down(): void {
    this.addSql(`alter table "note" drop constraint "note_parent_id_foreign";`);

    this.addSql(`alter table "next_item" drop constraint "next_item_note_id_foreign";`);

    this.addSql(`alter table "complaint" drop constraint "complaint_note_id_foreign";`);

    this.addSql(`drop table if exists "read_mark" cascade;`);

    this.addSql(`drop table if exists "note" cascade;`);

    this.addSql(`drop table if exists "next_item" cascade;`);

    this.addSql(`drop table if exists "complaint" cascade;`);

    this.addSql(`drop function "tell_of_notes";`);
    this.addSql(`drop function "tell_of_next_item";`);
  }
}
