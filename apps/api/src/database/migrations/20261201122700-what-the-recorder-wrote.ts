import { Migration } from '@mikro-orm/migrations';

export class Migration20261201122700_whatTheRecorderWrote extends Migration {
  override up(): void {
    this.addSql(`alter table "take_file" add column "broadcast" jsonb null;`);
  }

  override down(): void {
    this.addSql(`alter table "take_file" drop column "broadcast";`);
  }
}
