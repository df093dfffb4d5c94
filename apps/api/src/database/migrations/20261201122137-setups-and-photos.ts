import { Migration } from '@mikro-orm/migrations';

export class Migration20261201122137_setupsAndPhotos extends Migration {
  override up(): void {
    this.addSql(
      `create table "photo" ("id" uuid not null, "created_at" timestamptz not null, "owner_id" uuid not null, "object_key" varchar(255) not null, "bytes" int not null, "width_px" int not null, "height_px" int not null, constraint "photo_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "photo_owner_id_index" on "photo" ("owner_id");`);
    this.addSql(`alter table "photo" add constraint "photo_object_key_unique" unique ("object_key");`);

    this.addSql(
      `create table "setup" ("id" uuid not null, "created_at" timestamptz not null, "owner_id" uuid not null, "name" varchar(60) not null, "kick" jsonb not null, "overhead" jsonb not null, "kick_preamp" jsonb not null, "overhead_preamp" jsonb not null, "interface" varchar(80) not null, "rest" varchar(300) not null, "copied_from_id" uuid null, "photo_id" uuid null, constraint "setup_pkey" primary key ("id"));`,
    );
    this.addSql(`create index "setup_owner_id_index" on "setup" ("owner_id");`);
    this.addSql(`create index "setup_copied_from_id_index" on "setup" ("copied_from_id");`);
    this.addSql(`create index "setup_photo_id_index" on "setup" ("photo_id");`);

    this.addSql(
      `alter table "photo" add constraint "photo_owner_id_foreign" foreign key ("owner_id") references "user" ("id") on update cascade on delete cascade;`,
    );

    this.addSql(
      `alter table "setup" add constraint "setup_owner_id_foreign" foreign key ("owner_id") references "user" ("id") on update cascade on delete cascade;`,
    );
    this.addSql(
      `alter table "setup" add constraint "setup_copied_from_id_foreign" foreign key ("copied_from_id") references "setup" ("id") on update cascade on delete set null;`,
    );
    this.addSql(
      `alter table "setup" add constraint "setup_photo_id_foreign" foreign key ("photo_id") references "photo" ("id") on update cascade on delete set null;`,
    );

    this.addSql(`alter table "take" add column "setup_id" uuid null;`);
    this.addSql(
      `alter table "take" add constraint "take_setup_id_foreign" foreign key ("setup_id") references "setup" ("id") on update cascade on delete set null;`,
    );
    this.addSql(`create index "take_setup_id_index" on "take" ("setup_id");`);
  }

  override down(): void {
    this.addSql(`alter table "setup" drop constraint "setup_photo_id_foreign";`);

    this.addSql(`alter table "setup" drop constraint "setup_copied_from_id_foreign";`);

    this.addSql(`alter table "take" drop constraint "take_setup_id_foreign";`);

    this.addSql(`drop table if exists "photo" cascade;`);

    this.addSql(`drop table if exists "setup" cascade;`);

    this.addSql(`drop index "take_setup_id_index";`);
    this.addSql(`alter table "take" drop column "setup_id";`);
  }
}
