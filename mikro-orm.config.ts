import { Migrator } from '@mikro-orm/migrations';
import { defineConfig } from '@mikro-orm/postgresql';
import { Design, Membership, RecordEntry, ShopItem, User, Workshop } from './entities';
import { migrationsList } from './migrations';

export default defineConfig({
  clientUrl: process.env.DATABASE_URL,
  entities: [User, Workshop, Membership, Design, ShopItem, RecordEntry],
  extensions: [Migrator],
  migrations: { migrationsList, snapshot: false, tableName: 'migrations', silent: true },
  // Belongs to rate-limiter-flexible, which reads and writes it by itself.
  schemaGenerator: { skipTables: ['sign_in_attempts'] },
  forceUtcTimezone: true,
  pool: { min: 0, max: 10 },
});
