import { Migration } from '@mikro-orm/migrations';

export class Migration20261201093647_measureAgain extends Migration {
  override up(): void {
    this.addSql(
      `alter table "measurement" drop constraint "measurement_take_id_dsp_version_input_hash_unique";`,
    );

    this.addSql(
      `create unique index "measurement_once_index" on "measurement" ("take_id", "dsp_version", "input_hash") where "state" in ('queued', 'running', 'done');`,
    );
    this.addSql(`create index "measurement_take_id_index" on "measurement" ("take_id");`);
  }

  override down(): void {
    this.addSql(`drop index "measurement_once_index";`);
    this.addSql(`drop index "measurement_take_id_index";`);

    this.addSql(
      `alter table "measurement" add constraint "measurement_take_id_dsp_version_input_hash_unique" unique ("take_id", "dsp_version", "input_hash");`,
    );
  }
}
