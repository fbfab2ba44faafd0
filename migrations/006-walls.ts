import { Migration } from '@mikro-orm/migrations';

/** Tables whose rows belong to one workshop and are seen from within it alone. */
const OF_A_WORKSHOP = [
  'designs',
  'design_versions',
  'revisions',
  'revision_files',
  'shop_items',
  'cut_orders',
  'order_messages',
  'attachments',
  'record_entries',
];

/**
 * Row-level security: the application's role sees and writes the rows of the scope that its
 * transaction has named (lib/db.ts), and none where it has named none. The owner of the tables,
 * who migrates, sends mail and makes backups, sees all.
 */
export class Migration006Walls extends Migration {
  override up(): void {
    for (const [name, type] of [
      ['workshop', 'uuid'],
      ['user', 'uuid'],
      ['email', 'text'],
      ['token', 'text'],
    ]) {
      this.addSql(`
        create function scope_${name}() returns ${type} language sql stable parallel safe as
          $$ select nullif(current_setting('vaneloft.${name}', true), '')::${type} $$`);
    }

    for (const table of OF_A_WORKSHOP) {
      this.addSql(`alter table ${table} enable row level security`);
      this.addSql(`create policy of_the_workshop on ${table}
        using (workshop_id = scope_workshop()) with check (workshop_id = scope_workshop())`);
    }

    this.addSql('alter table memberships enable row level security');
    this.addSql(`create policy of_the_workshop_or_mine on memberships
      using (workshop_id = scope_workshop() or user_id = scope_user())
      with check (workshop_id = scope_workshop())`);

    // Those one is a member of, and the one that an invitation in hand leads to.
    this.addSql('alter table workshops enable row level security');
    this.addSql(`create policy mine on workshops
      using (id = scope_workshop()
        or exists (select 1 from memberships m
          where m.workshop_id = workshops.id and m.user_id = scope_user())
        or exists (select 1 from invitations i
          where i.workshop_id = workshops.id and i.token_hash = scope_token()))
      with check (id = scope_workshop())`);

    // Oneself, who signs in, and everybody who is or was in the workshop.
    this.addSql('alter table users enable row level security');
    this.addSql(`create policy seen on users for select
      using (id = scope_user() or email = scope_email()
        or exists (select 1 from memberships m
          where m.user_id = users.id and m.workshop_id = scope_workshop())
        or exists (select 1 from invitations i
          where i.invited_by_id = users.id and i.token_hash = scope_token())
        or exists (select 1 from password_resets r
          where r.user_id = users.id and r.token_hash = scope_token()))`);
    this.addSql('create policy made on users for insert with check (id = scope_user())');
    this.addSql(`create policy changed on users for update
      using (id = scope_user()) with check (id = scope_user())`);

    this.addSql('alter table invitations enable row level security');
    this.addSql(`create policy of_the_workshop_or_in_hand on invitations
      using (workshop_id = scope_workshop() or token_hash = scope_token())
      with check (workshop_id = scope_workshop() or token_hash = scope_token())`);

    this.addSql('alter table password_resets enable row level security');
    this.addSql(`create policy mine_or_in_hand on password_resets
      using (user_id = scope_user() or token_hash = scope_token())
      with check (user_id = scope_user() or token_hash = scope_token())`);

    this.addSql('alter table mails enable row level security');
    this.addSql(`create policy of_the_workshop on mails
      using (workshop_id = scope_workshop()
        or (workshop_id is null and to_address = scope_email()))
      with check (workshop_id = scope_workshop()
        or (workshop_id is null and to_address = scope_email()))`);
  }

  override down(): void {
    for (const table of OF_A_WORKSHOP) {
      this.addSql(`drop policy of_the_workshop on ${table}`);
      this.addSql(`alter table ${table} disable row level security`);
    }
    this.addSql('drop policy of_the_workshop_or_mine on memberships');
    this.addSql('drop policy mine on workshops');
    this.addSql('drop policy seen on users');
    this.addSql('drop policy made on users');
    this.addSql('drop policy changed on users');
    this.addSql('drop policy of_the_workshop_or_in_hand on invitations');
    this.addSql('drop policy mine_or_in_hand on password_resets');
    this.addSql('drop policy of_the_workshop on mails');
    const others = [
      'memberships',
      'workshops',
      'users',
      'invitations',
      'password_resets',
      'mails',
    ];
    for (const table of others) {
      this.addSql(`alter table ${table} disable row level security`);
    }
    this.addSql('drop function scope_workshop, scope_user, scope_email, scope_token');
  }
}
