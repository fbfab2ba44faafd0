/** The database as the owner of its tables sees it: all rows of all workshops. */

import { MikroORM, type EntityManager } from '@mikro-orm/postgresql';
import config from '@/mikro-orm.config';

let orm: Promise<MikroORM> | undefined;

export async function entityManager(): Promise<EntityManager> {
  orm ??= MikroORM.init({ ...config, clientUrl: process.env.OWNER_DATABASE_URL! });
  return (await orm).em.fork();
}

export async function closeOwner(): Promise<void> {
  await (await orm)?.close();
}
