import { MikroORM } from '@mikro-orm/postgresql';
import { afterAll, beforeAll, expect, test } from 'vitest';
import config from '@/mikro-orm.config';

let orm: MikroORM;

beforeAll(async () => {
  orm = await MikroORM.init({ ...config, clientUrl: process.env.OWNER_DATABASE_URL! });
});
afterAll(() => orm.close());

/** What would have to be done to the database for it to be what the entities say. */
const drift = () => orm.schema.getUpdateSchemaSQL({ wrap: false });

test('the migrations make just what the entities say', async () => {
  expect(await drift()).toBe('');
});

test('a missing column would be seen', async () => {
  const em = orm.em.fork();
  await em.execute('alter table designs rename column kernel to kernels');
  expect(await drift()).toContain('kernel');
  await em.execute('alter table designs rename column kernels to kernel');
  expect(await drift()).toBe('');
});

test('they can be taken back and made again', async () => {
  await orm.migrator.down({ to: 0 });
  const left = await orm.em.execute(
    "select table_name from information_schema.tables where table_schema = 'public'",
  );
  expect(left).toEqual([{ table_name: 'migrations' }]);
  await orm.migrator.up();
  expect(await drift()).toBe('');
});
