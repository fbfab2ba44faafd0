/**
 * What the application's own role may do with each table; row-level security (006-walls) says with
 * which rows. It owns nothing, and nobody but the owner may delete what the workshop has made.
 */
const rights: Readonly<Record<string, string>> = {
  users: 'select, insert, update',
  workshops: 'select, insert, update',
  memberships: 'select, insert, update',
  invitations: 'select, insert, update',
  password_resets: 'select, insert, update',
  mails: 'select, insert',
  designs: 'select, insert, update',
  design_versions: 'select, insert',
  revisions: 'select, insert, update',
  revision_files: 'select, insert, delete',
  shop_items: 'select, insert, update',
  cut_orders: 'select, insert, update',
  order_messages: 'select, insert',
  attachments: 'select, insert',
  record_entries: 'select, insert',
  sign_in_attempts: 'select, insert, update, delete',
};

/** SQL that gives a role these rights and no others. Safe to run again. */
export function rightsSql(role: string): string {
  const quoted = `"${role.replaceAll('"', '""')}"`;
  return [
    `revoke all on all tables in schema public from ${quoted}`,
    `grant usage on schema public to ${quoted}`,
    `grant usage on all sequences in schema public to ${quoted}`,
    ...Object.entries(rights).map(
      ([table, allowed]) => `grant ${allowed} on ${table} to ${quoted}`,
    ),
  ].join(';\n');
}
