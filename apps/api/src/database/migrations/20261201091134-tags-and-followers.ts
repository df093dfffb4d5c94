import { Migration } from '@mikro-orm/migrations';

export class Migration20261201091134_tagsAndFollowers extends Migration {
  override up(): void {
    this.addSql(`alter table "user" add column "email_verified_at" timestamptz null;`);

    this.addSql(
      `alter table "take" add column "tags" text[] not null default '{}', add column "follows_take_id" uuid null, add column "done_actions" jsonb not null default '[]';`,
    );
    this.addSql(
      `alter table "take" add constraint "take_follows_take_id_foreign" foreign key ("follows_take_id") references "take" ("id") on update cascade on delete set null;`,
    );
    this.addSql(`create index "take_follows_take_id_index" on "take" ("follows_take_id");`);
    this.addSql(
      `create index "take_deleted_index" on "take" ("owner_id", "deleted_at") where "deleted_at" is not null;`,
    );
    this.addSql(`create index "take_tags_index" on "take" using gin ("tags");`);

    this.addSql(
      `alter table "report" add column "kick_noise_dbfs" double precision null, add column "overhead_noise_dbfs" double precision null, add column "adding_up" varchar(20) not null default 'cannot-tell', add column "says" text not null default '';`,
    );
    // Reports of before: what their facts hold. Their words are written when they are measured again or the target changes.
    this.addSql(
      `update "report" set "kick_noise_dbfs" = ("summary" #>> '{tracks,0,noiseFloorDbfs}')::double precision, "overhead_noise_dbfs" = ("summary" #>> '{tracks,1,noiseFloorDbfs}')::double precision, "adding_up" = case when "verdict" = 'cannot-tell' then 'cannot-tell' when ("summary" #>> '{pairs,0,agreement,sure}') = 'false' then 'watch' when "verdict" = 'flip' then 'fix' else 'good' end;`,
    );
    this.addSql(
      `alter table "report" alter column "adding_up" drop default, alter column "says" drop default;`,
    );

    this.addSql(`alter table "session" add column "read_only" boolean not null default false;`);
  }

  override down(): void {
    this.addSql(`alter table "take" drop constraint "take_follows_take_id_foreign";`);

    this.addSql(`alter table "user" drop column "email_verified_at";`);

    this.addSql(`drop index "take_follows_take_id_index";`);
    this.addSql(`drop index "take_deleted_index";`);
    this.addSql(`drop index "take_tags_index";`);
    this.addSql(
      `alter table "take" drop column "tags", drop column "follows_take_id", drop column "done_actions";`,
    );

    this.addSql(
      `alter table "report" drop column "kick_noise_dbfs", drop column "overhead_noise_dbfs", drop column "adding_up", drop column "says";`,
    );

    this.addSql(`alter table "session" drop column "read_only";`);
  }
}
