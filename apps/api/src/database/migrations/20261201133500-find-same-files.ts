import { Migration } from '@mikro-orm/migrations';

export class Migration20261201133500_findSameFiles extends Migration {
  override up(): void {
    this.addSql(`create index "take_file_sha256_index" on "take_file" ("sha256");`);
  }

  override down(): void {
    this.addSql(`drop index "take_file_sha256_index";`);
  }
}
