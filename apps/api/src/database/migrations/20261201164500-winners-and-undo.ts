import { Migration } from '@mikro-orm/migrations';

export class Migration20261201164500_winnersAndUndo extends Migration {
  override up(): void {
    this.addSql(`alter table "user" add column "current_setup_id" uuid null;`);

    this.addSql(
      `alter table "try_out" add column "winner_setup_id" uuid null, add column "setup_before_id" uuid null, add column "deleted_at" timestamptz null;`,
    );
    this.addSql(
      `alter table "try_out" add constraint "try_out_winner_setup_id_foreign" foreign key ("winner_setup_id") references "setup" ("id") on update cascade on delete set null;`,
    );
    this.addSql(`create index "try_out_winner_setup_id_index" on "try_out" ("winner_setup_id");`);

    this.addSql(`alter table "try_out_place" add column "removed_at" timestamptz null;`);
  }

  override down(): void {
    this.addSql(`alter table "try_out" drop constraint "try_out_winner_setup_id_foreign";`);

    this.addSql(`alter table "user" drop column "current_setup_id";`);

    this.addSql(`drop index "try_out_winner_setup_id_index";`);
    this.addSql(
      `alter table "try_out" drop column "winner_setup_id", drop column "setup_before_id", drop column "deleted_at";`,
    );

    this.addSql(`alter table "try_out_place" drop column "removed_at";`);
  }
}
