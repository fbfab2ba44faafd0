/** The demo workshop's orders are such as the application itself could have made. */

import { expect, test } from 'vitest';
import { CutOrder, Workshop } from '@/entities';
import { GET as LIST } from '@/app/api/orders/route';
import { orderListSchema } from '@/lib/schemas/order';
import { addOrders } from '@/scripts/seed-orders';
import { entityManager } from '../support/as-owner';
import { call } from '../support/call';
import { Cast } from '../support/cast';
import {
  addMachine,
  addSheet,
  begin,
  get,
  orderIn,
  place,
  termsOf,
  write,
} from '../support/orders';
import { revisionOf } from '../support/released';

async function seedOrders(cast: Cast): Promise<void> {
  const em = await entityManager();
  await addOrders(em, await em.findOneOrFail(Workshop, cast.workshopId));
  await em.flush();
}

test('one overdue, one that was asked about, one that waits; each can go on', async () => {
  const cast = await Cast.gather();
  const revision = await revisionOf(cast, await cast.design(), 1);
  const machine = await addMachine(cast);
  await cast.item('sheet', 'A sheet that nothing wants', { material: 'copper' } as never);
  const sheet = await addSheet(cast);
  await seedOrders(cast);

  cast.ask('machinist');
  const { orders } = orderListSchema.parse(await (await call(LIST, {})).json());
  expect(orders.map(({ number, state }) => [number, state])).toEqual([
    [1, 'queued'],
    [2, 'cutting'],
    [3, 'returned'],
  ]);
  const today = new Date().toISOString().slice(0, 10);
  expect(orders.map(({ dueOn }) => dueOn < today)).toEqual([true, false, false]);
  expect(new Set(orders.map((order) => order.sheet.id))).toEqual(new Set([sheet]));
  const [overdue, asked, waiting] = orders;
  expect((await begin(overdue!.id, { version: overdue!.version })).status).toBe(200);
  const { messages } = await orderIn(await get(asked!.id));
  expect(messages.map(({ kind }) => kind)).toEqual(['question', 'answer']);

  cast.ask('builder');
  const answer = { kind: 'answer', text: 'Yes.', version: waiting!.version };
  expect(await orderIn(await write(waiting!.id, answer))).toMatchObject({ state: 'queued' });
  expect(await orderIn(await place(termsOf(revision, sheet, machine)))).toMatchObject({
    number: 4,
  });
});

test('none where nothing is released', async () => {
  const cast = await Cast.gather();
  await revisionOf(cast, await cast.design(), 1, 'in-review');
  await addMachine(cast);
  await addSheet(cast);
  await seedOrders(cast);
  const em = await entityManager();
  expect(await em.count(CutOrder, { workshop: cast.workshopId })).toBe(0);
});
