import { Migration } from '@mikro-orm/migrations';

const changed = `(old."state", old."stage", old."progress", old."attempt")
        is distinct from (new."state", new."stage", new."progress", new."attempt")`;

/** Sheets of earlier versions are measured again behind their readers; lists are filtered by what findings ask about. */
export class Migration20261201132900_renewalsAndTopics extends Migration {
  override up(): void {
    this.addSql(`alter table "measurement" add column "renewal" boolean not null default false;`);
    this.addSql(`alter table "report" add column "topics" text[] null;`);
    this.addSql(`create index "report_topics_index" on "report" using gin ("topics");`);
    this.addSql(`create index "report_untold_index" on "report" ("measurement_id") where "topics" is null;`);
    // Nobody waits for a renewal's progress; that there is a new sheet is told.
    this.addSql(`drop trigger "measurement_changed" on "measurement";`);
    this.addSql(`
      create trigger "measurement_changed" after update on "measurement" for each row
      when (${changed} and (not new."renewal" or new."state" in ('done', 'failed')))
      execute function "tell_of_measurement"();`);
    this.addSql(`drop trigger "measurement_added" on "measurement";`);
    this.addSql(`
      create trigger "measurement_added" after insert on "measurement" for each row
      when (not new."renewal") execute function "tell_of_measurement"();`);
  }

  override down(): void {
    this.addSql(`drop trigger "measurement_added" on "measurement";`);
    this.addSql(`
      create trigger "measurement_added" after insert on "measurement" for each row
      execute function "tell_of_measurement"();`);
    this.addSql(`drop trigger "measurement_changed" on "measurement";`);
    this.addSql(`
      create trigger "measurement_changed" after update on "measurement" for each row
      when (${changed}) execute function "tell_of_measurement"();`);
    this.addSql(`drop index "report_untold_index";`);
    this.addSql(`drop index "report_topics_index";`);
    this.addSql(`alter table "report" drop column "topics";`);
    this.addSql(`alter table "measurement" drop column "renewal";`);
  }
}
