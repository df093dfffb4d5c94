import { Migration } from '@mikro-orm/migrations';

export class Migration20261201092034_settings extends Migration {
  override up(): void {
    this.addSql(
      `create table "setting" ("key" varchar(40) not null, "value" text not null, constraint "setting_pkey" primary key ("key"));`,
    );
  }

  override down(): void {
    this.addSql(`drop table if exists "setting" cascade;`);
  }
}
