import { Migration } from '@mikro-orm/migrations';

/** A photo of a room, and of a change to it. */
export class Migration20261201165900_roomPhotos extends Migration {
  override up(): void {
    for (const table of ['room', 'room_change']) {
      this.addSql(`alter table "${table}" add column "photo_id" uuid null;`);
      this.addSql(
        `alter table "${table}" add constraint "${table}_photo_id_foreign" foreign key ("photo_id") references "photo" ("id") on update cascade on delete set null;`,
      );
      this.addSql(`create index "${table}_photo_id_index" on "${table}" ("photo_id");`);
    }
  }

  override down(): void {
    for (const table of ['room', 'room_change']) {
      this.addSql(`alter table "${table}" drop constraint "${table}_photo_id_foreign";`);
      this.addSql(`drop index "${table}_photo_id_index";`);
      this.addSql(`alter table "${table}" drop column "photo_id";`);
    }
  }
}
