import { Migration } from '@mikro-orm/migrations';

/** People, workshops, designs, the record of who did what, and the count of sign-in attempts. */
export class Migration001Start extends Migration {
  override up(): void {
    this.addSql(`
      create table users (
        id uuid primary key,
        created_at timestamptz(3) not null,
        email varchar(254) not null constraint users_email_unique unique,
        name varchar(80) not null,
        password_hash varchar(255) not null,
        constraint users_email_check check (email = lower(email))
      )`);

    this.addSql(`
      create table workshops (
        id uuid primary key,
        created_at timestamptz(3) not null,
        name varchar(80) not null
      )`);

    this.addSql(`
      create table memberships (
        id uuid primary key,
        created_at timestamptz(3) not null,
        user_id uuid not null,
        workshop_id uuid not null,
        role text not null check (role in ('owner', 'builder', 'machinist')),
        constraint memberships_user_id_foreign
          foreign key (user_id) references users on update cascade on delete cascade,
        constraint memberships_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade on delete cascade,
        constraint memberships_user_id_workshop_id_unique unique (user_id, workshop_id)
      )`);
    this.addSql('create index memberships_workshop_id_index on memberships (workshop_id)');

    this.addSql(`
      create table designs (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        name varchar(80) not null,
        status text not null default 'draft' check (status in ('draft', 'ready')),
        version int not null default 1,
        parameters jsonb not null,
        parameters_format int not null default 1,
        kernel varchar(20) not null,
        checks jsonb not null,
        created_by_id uuid not null,
        updated_by_id uuid not null,
        updated_at timestamptz(3) not null,
        deleted_at timestamptz(3),
        constraint designs_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint designs_created_by_id_foreign
          foreign key (created_by_id) references users on update cascade,
        constraint designs_updated_by_id_foreign
          foreign key (updated_by_id) references users on update cascade
      )`);
    this.addSql(
      'create index designs_workshop_id_updated_at_index on designs (workshop_id, updated_at)',
    );

    this.addSql(`
      create table record_entries (
        id bigserial primary key,
        at timestamptz(3) not null,
        workshop_id uuid not null,
        who_id uuid not null,
        what text not null check (what in ('workshop-opened', 'design-created', 'design-saved',
          'design-status-set', 'design-deleted', 'file-downloaded')),
        subject uuid not null,
        detail jsonb not null,
        constraint record_entries_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint record_entries_who_id_foreign
          foreign key (who_id) references users on update cascade
      )`);
    this.addSql(
      'create index record_entries_workshop_id_at_index on record_entries (workshop_id, at)',
    );
    this.addSql('create index record_entries_subject_index on record_entries (subject)');

    // Append-only by the database, whatever the application is made to do.
    this.addSql(`
      create function refuse_record_change() returns trigger language plpgsql as $$
      begin
        raise exception 'record_entries only takes new rows; % refused', tg_op;
      end $$`);
    this.addSql(`
      create trigger record_entries_append_only
        before update or delete or truncate on record_entries
        for each statement execute function refuse_record_change()`);

    // The shape that rate-limiter-flexible's RateLimiterPostgres expects. Unlogged: attempts
    // may be forgotten after a crash, and counting them must be cheap.
    this.addSql(`
      create unlogged table sign_in_attempts (
        key varchar(255) primary key,
        points int not null default 0,
        expire bigint
      )`);
  }

  override down(): void {
    this.addSql('drop table sign_in_attempts, record_entries, designs, memberships');
    this.addSql('drop function refuse_record_change');
    this.addSql('drop table workshops, users');
  }
}
