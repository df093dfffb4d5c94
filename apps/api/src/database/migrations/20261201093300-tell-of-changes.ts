import { Migration } from '@mikro-orm/migrations';

/**
 * The database itself tells of every change that somebody may be waiting for, whoever makes it: API, worker or sweep.
 * A notification leaves with the transaction, and carries ids only; whoever hears it reads what is so by then.
 */
export class Migration20261201093300_tellOfChanges extends Migration {
  override up(): void {
    this.addSql(`
      create function "tell_of_measurement"() returns trigger language plpgsql as $$
      begin
        perform pg_notify('thudline_measurement', new."take_id"::text);
        return null;
      end $$;`);
    this.addSql(`
      create trigger "measurement_changed" after update on "measurement" for each row
      when ((old."state", old."stage", old."progress", old."attempt")
        is distinct from (new."state", new."stage", new."progress", new."attempt"))
      execute function "tell_of_measurement"();`);
    this.addSql(`
      create trigger "measurement_added" after insert on "measurement" for each row
      execute function "tell_of_measurement"();`);
    this.addSql(`
      create function "tell_of_take"() returns trigger language plpgsql as $$
      begin
        perform pg_notify('thudline_take_added', json_build_object(
          'takeId', new."id", 'ownerId', new."owner_id", 'followsTakeId', new."follows_take_id")::text);
        return null;
      end $$;`);
    this.addSql(`
      create trigger "take_added" after insert on "take" for each row
      execute function "tell_of_take"();`);
  }

  override down(): void {
    this.addSql(`drop trigger "take_added" on "take";`);
    this.addSql(`drop function "tell_of_take";`);
    this.addSql(`drop trigger "measurement_added" on "measurement";`);
    this.addSql(`drop trigger "measurement_changed" on "measurement";`);
    this.addSql(`drop function "tell_of_measurement";`);
  }
}
