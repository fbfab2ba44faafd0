import { Migration } from '@mikro-orm/migrations';

const before = `'workshop-opened', 'design-created', 'design-saved', 'design-status-set',
  'design-deleted', 'file-downloaded'`;

/** The workshop's machines and sheet, and what is recorded of them. */
export class Migration002ShopItems extends Migration {
  override up(): void {
    this.addSql(`
      create table shop_items (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        kind text not null check (kind in ('machine', 'sheet')),
        name varchar(80) not null,
        version int not null default 1,
        "values" jsonb not null,
        updated_by_id uuid not null,
        updated_at timestamptz(3) not null,
        deleted_at timestamptz(3),
        constraint shop_items_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint shop_items_updated_by_id_foreign
          foreign key (updated_by_id) references users on update cascade
      )`);
    this.addSql(
      'create index shop_items_workshop_id_kind_index on shop_items (workshop_id, kind)',
    );
    this.addSql('alter table record_entries drop constraint record_entries_what_check');
    this.addSql(`
      alter table record_entries add constraint record_entries_what_check
        check (what in (${before}, 'item-created', 'item-saved', 'item-deleted'))`);
  }

  override down(): void {
    this.addSql('drop table shop_items');
    this.addSql('alter table record_entries drop constraint record_entries_what_check');
    this.addSql(`
      alter table record_entries add constraint record_entries_what_check
        check (what in (${before})) not valid`);
  }
}
