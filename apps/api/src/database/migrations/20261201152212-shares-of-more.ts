import { Migration } from '@mikro-orm/migrations';

/** Links to comparisons, try-outs and rooms as well; passphrases, notes, whom they are for, and shares with one person. */
export class Migration20261201152212_sharesOfMore extends Migration {
  override up(): void {
    this.addSql(
      `alter table "share" add column "other_take_id" uuid null, add column "try_out_id" uuid null, add column "room_id" uuid null, add column "grantee_id" uuid null, add column "passphrase_hash" text null, add column "mailed_to" varchar(254) null, add column "label" varchar(60) not null default '', add column "can_note" boolean not null default false;`,
    );
    this.addSql(`alter table "share" alter column "take_id" drop not null;`);
    this.addSql(`alter table "share" alter column "token_hash" drop not null;`);
    this.addSql(
      `alter table "share" add constraint "share_other_take_id_foreign" foreign key ("other_take_id") references "take" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "share" add constraint "share_try_out_id_foreign" foreign key ("try_out_id") references "try_out" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "share" add constraint "share_room_id_foreign" foreign key ("room_id") references "room" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "share" add constraint "share_grantee_id_foreign" foreign key ("grantee_id") references "user" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(`create index "share_other_take_id_index" on "share" ("other_take_id");`);
    this.addSql(`create index "share_try_out_id_index" on "share" ("try_out_id");`);
    this.addSql(`create index "share_room_id_index" on "share" ("room_id");`);
    this.addSql(`create index "share_grantee_id_index" on "share" ("grantee_id");`);
    this.addSql(
      `alter table "share" add constraint share_one_subject_check check(num_nonnulls(take_id, try_out_id, room_id) = 1);`,
    );
    this.addSql(
      `alter table "share" add constraint share_other_take_check check(other_take_id is null or take_id is not null);`,
    );
    this.addSql(
      `alter table "share" add constraint share_opens_to_somebody_check check(num_nonnulls(token_hash, grantee_id, mailed_to) >= 1);`,
    );
  }

  override down(): void {
    // What could not be told before goes; without its passphrase a link would open to anybody.
    this.addSql(
      `delete from "share" where "take_id" is null or "other_take_id" is not null or "token_hash" is null or "passphrase_hash" is not null;`,
    );

    this.addSql(`alter table "share" drop constraint "share_other_take_id_foreign";`);
    this.addSql(`alter table "share" drop constraint "share_try_out_id_foreign";`);
    this.addSql(`alter table "share" drop constraint "share_room_id_foreign";`);
    this.addSql(`alter table "share" drop constraint "share_grantee_id_foreign";`);

    this.addSql(`drop index "share_other_take_id_index";`);
    this.addSql(`drop index "share_try_out_id_index";`);
    this.addSql(`drop index "share_room_id_index";`);
    this.addSql(`drop index "share_grantee_id_index";`);
    this.addSql(`alter table "share" drop constraint share_one_subject_check;`);
    this.addSql(`alter table "share" drop constraint share_other_take_check;`);
    this.addSql(`alter table "share" drop constraint share_opens_to_somebody_check;`);
    this.addSql(
      `alter table "share" drop column "other_take_id", drop column "try_out_id", drop column "room_id", drop column "grantee_id", drop column "passphrase_hash", drop column "mailed_to", drop column "label", drop column "can_note";`,
    );

    this.addSql(`alter table "share" alter column "take_id" set not null;`);
    this.addSql(`alter table "share" alter column "token_hash" set not null;`);
  }
}
