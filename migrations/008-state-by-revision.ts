import { Migration } from '@mikro-orm/migrations';

/** Whether a design may be cut is said by its revisions, no longer by a mark on the draft. */
export class Migration008StateByRevision extends Migration {
  override up(): void {
    this.addSql('alter table designs drop column status');
  }

  override down(): void {
    this.addSql(`alter table designs add status text not null default 'draft'
      check (status in ('draft', 'ready'))`);
  }
}
