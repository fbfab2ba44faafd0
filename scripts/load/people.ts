import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import { Client } from 'pg';

interface Person {
  readonly cookie: string;
}

/** A workshop of one owner and many builders, each with a session as next-auth seals it. */
export async function gather(
  ownerUrl: string,
  secret: string,
  count: number,
): Promise<{ owner: Person; builders: Person[] }> {
  const database = new Client({ connectionString: ownerUrl });
  await database.connect();
  const workshop = randomUUID();
  await database.query(
    "insert into workshops (id, created_at, name) values ($1, now(), 'Load bench')",
    [workshop],
  );
  const join = async (role: string): Promise<Person> => {
    const id = randomUUID();
    await database.query(
      `insert into users (id, created_at, email, name, password_hash, session_epoch)
       values ($1, now(), $2, $3, 'none', 0)`,
      [id, `${id}@load.example`, `${role} ${id.slice(0, 4)}`],
    );
    await database.query(
      `insert into memberships (id, created_at, user_id, workshop_id, role, muted_mail)
       values (gen_random_uuid(), now(), $1, $2, $3, '[]')`,
      [id, workshop, role],
    );
    const token = await encode({ token: { sub: id, epoch: 0 }, secret });
    return { cookie: `next-auth.session-token=${token}` };
  };
  const owner = await join('owner');
  const builders: Person[] = [];
  for (let i = 0; i < count; i++) builders.push(await join('builder'));
  await database.end();
  return { owner, builders };
}
