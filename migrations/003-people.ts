import { Migration } from '@mikro-orm/migrations';

const RECORDED = `'workshop-opened', 'design-created', 'design-saved', 'design-status-set',
  'design-deleted', 'file-downloaded', 'item-created', 'item-saved', 'item-deleted'`;

/**
 * Invitations, removal, password resets, ended sessions and mail; the record takes any verb, since
 * the application's own list has grown beyond what a constraint should repeat.
 */
export class Migration003People extends Migration {
  override up(): void {
    this.addSql('alter table users add session_epoch int not null default 0');
    this.addSql('alter table users alter session_epoch drop default');
    this.addSql(`alter table memberships
      add muted_mail jsonb not null default '[]', add removed_at timestamptz(3)`);
    this.addSql('alter table memberships alter muted_mail drop default');

    this.addSql(`
      create table invitations (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid not null,
        email varchar(254) not null,
        role text not null check (role in ('owner', 'builder', 'machinist')),
        token_hash varchar(43) not null constraint invitations_token_hash_unique unique,
        invited_by_id uuid not null,
        expires_at timestamptz(3) not null,
        used_at timestamptz(3),
        withdrawn_at timestamptz(3),
        constraint invitations_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade,
        constraint invitations_invited_by_id_foreign
          foreign key (invited_by_id) references users on update cascade
      )`);
    this.addSql('create index invitations_workshop_id_index on invitations (workshop_id)');

    this.addSql(`
      create table password_resets (
        id uuid primary key,
        created_at timestamptz(3) not null,
        user_id uuid not null,
        token_hash varchar(43) not null constraint password_resets_token_hash_unique unique,
        expires_at timestamptz(3) not null,
        used_at timestamptz(3),
        constraint password_resets_user_id_foreign
          foreign key (user_id) references users on update cascade on delete cascade
      )`);
    this.addSql('create index password_resets_user_id_index on password_resets (user_id)');

    this.addSql(`
      create table mails (
        id uuid primary key,
        created_at timestamptz(3) not null,
        workshop_id uuid,
        kind varchar(40) not null,
        event varchar(120) not null,
        to_address varchar(254) not null,
        subject varchar(200) not null,
        text text not null,
        html text not null,
        secret boolean not null,
        attempts int not null,
        last_error varchar(300),
        sent_at timestamptz(3),
        constraint mails_workshop_id_foreign
          foreign key (workshop_id) references workshops on update cascade on delete set null,
        constraint mails_event_to_address_unique unique (event, to_address)
      )`);
    this.addSql(
      'create index mails_workshop_id_created_at_index on mails (workshop_id, created_at)',
    );
    // The queue's own tables are its owner's; whoever may write a mail may have it sent.
    this.addSql(`
      create function queue_mail() returns trigger language plpgsql security definer
      set search_path = pg_catalog, public as $$
      begin
        perform graphile_worker.add_job('send-mail', json_build_object('id', new.id),
          job_key := 'mail:' || new.id, max_attempts := 25);
        return new;
      end $$`);
    this.addSql(`
      create trigger mails_queue after insert on mails
        for each row execute function queue_mail()`);

    this.addSql('alter table record_entries drop constraint record_entries_what_check');
    this.addSql('alter table record_entries alter what type varchar(40), add revision uuid');
    this.addSql('create index record_entries_revision_index on record_entries (revision)');
  }

  override down(): void {
    this.addSql('alter table record_entries drop column revision, alter what type text');
    this.addSql(`
      alter table record_entries add constraint record_entries_what_check
        check (what in (${RECORDED})) not valid`);
    this.addSql('drop table mails, password_resets, invitations');
    this.addSql('drop function queue_mail');
    this.addSql('alter table memberships drop column muted_mail, drop column removed_at');
    this.addSql('alter table users drop column session_epoch');
  }
}
