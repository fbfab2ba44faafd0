import { Migration } from '@mikro-orm/migrations';

/** Cut orders, what is written under them, and the store that is never less than empty. */
export class Migration005Orders extends Migration {
  override up(): void {
    this.addSql(`
      create table cut_orders (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        number int not null,
        revision_id uuid not null,
        quantity int not null check (quantity > 0),
        machine_id uuid not null,
        sheet_id uuid not null,
        sheets int not null check (sheets >= 0),
        due_on date not null,
        note varchar(500) not null,
        state text not null
          check (state in ('queued', 'cutting', 'cut', 'returned', 'cancelled')),
        version int not null,
        ordered_by_id uuid not null,
        taken_by_id uuid,
        scrap int,
        actual_kerf double precision,
        cut_at timestamptz(3),
        updated_at timestamptz(3) not null,
        constraint cut_orders_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint cut_orders_revision_id_foreign
          foreign key (revision_id) references revisions on update cascade,
        constraint cut_orders_machine_id_foreign
          foreign key (machine_id) references shop_items on update cascade,
        constraint cut_orders_sheet_id_foreign
          foreign key (sheet_id) references shop_items on update cascade,
        constraint cut_orders_ordered_by_id_foreign
          foreign key (ordered_by_id) references users on update cascade,
        constraint cut_orders_taken_by_id_foreign
          foreign key (taken_by_id) references users on update cascade on delete set null,
        constraint cut_orders_workshop_id_number_unique unique (workshop_id, number)
      )`);
    this.addSql(
      'create index cut_orders_workshop_id_state_due_on_index on cut_orders (workshop_id, state, due_on)',
    );
    this.addSql(`
      create table order_messages (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        order_id uuid not null,
        author_id uuid not null,
        kind text not null check (kind in ('remark', 'question', 'answer')),
        text varchar(2000) not null,
        constraint order_messages_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint order_messages_order_id_foreign
          foreign key (order_id) references cut_orders on update cascade,
        constraint order_messages_author_id_foreign
          foreign key (author_id) references users on update cascade
      )`);
    this.addSql(
      'create index order_messages_order_id_created_at_index on order_messages (order_id, created_at)',
    );
    this.addSql(`
      create table attachments (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        message_id uuid not null,
        name varchar(200) not null,
        media_type varchar(100) not null,
        bytes int not null,
        sha256 varchar(64) not null,
        body bytea not null,
        constraint attachments_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint attachments_message_id_foreign
          foreign key (message_id) references order_messages on update cascade
      )`);
    this.addSql('create index attachments_message_id_index on attachments (message_id)');

    this.addSql(`
      alter table shop_items add constraint shop_items_count_check
        check (kind <> 'sheet' or ("values"->>'count')::numeric >= 0)`);
  }

  override down(): void {
    this.addSql('alter table shop_items drop constraint shop_items_count_check');
    this.addSql('drop table attachments, order_messages, cut_orders');
  }
}
