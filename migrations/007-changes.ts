import { Migration } from '@mikro-orm/migrations';

/** Tells every process what was recorded, when it is committed: open screens follow it. */
export class Migration007Changes extends Migration {
  override up(): void {
    this.addSql(`
      create function tell_change() returns trigger language plpgsql as $$
      begin
        perform pg_notify('vaneloft_changes', json_build_object('id', new.id::text,
          'workshop', new.workshop_id, 'what', new.what, 'subject', new.subject,
          'revision', new.revision, 'who', new.who_id)::text);
        return new;
      end $$`);
    this.addSql(`
      create trigger record_entries_tell after insert on record_entries
        for each row execute function tell_change()`);
  }

  override down(): void {
    this.addSql('drop trigger record_entries_tell on record_entries');
    this.addSql('drop function tell_change');
  }
}
