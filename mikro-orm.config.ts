import { Migrator } from '@mikro-orm/migrations';
import { defineConfig } from '@mikro-orm/postgresql';
import {
  Attachment,
  CutOrder,
  Design,
  DesignVersion,
  Invitation,
  Mail,
  Membership,
  OrderMessage,
  PasswordReset,
  RecordEntry,
  Revision,
  RevisionFile,
  ShopItem,
  User,
  Workshop,
} from './entities';
import { migrationsList } from './migrations';

/** As the owner of the tables: migrating, seeding, sending mail. The application has a role of its own (lib/db.ts). */
export default defineConfig({
  clientUrl: process.env.OWNER_DATABASE_URL,
  entities: [
    User,
    Workshop,
    Membership,
    Invitation,
    PasswordReset,
    Mail,
    Design,
    DesignVersion,
    Revision,
    RevisionFile,
    ShopItem,
    CutOrder,
    OrderMessage,
    Attachment,
    RecordEntry,
  ],
  extensions: [Migrator],
  migrations: { migrationsList, snapshot: false, tableName: 'migrations', silent: true },
  schemaGenerator: {
    // Belongs to rate-limiter-flexible, which reads and writes it by itself.
    skipTables: ['sign_in_attempts'],
    // Belongs to graphile-worker.
    ignoreSchema: ['graphile_worker'],
  },
  forceUtcTimezone: true,
  pool: { min: 0, max: 10 },
});
