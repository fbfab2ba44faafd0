/** What an order is placed with, and the calls of its routes. */

import { POST as BEGIN } from '@/app/api/orders/[id]/begin/route';
import { POST as CANCEL } from '@/app/api/orders/[id]/cancel/route';
import { POST as FINISH } from '@/app/api/orders/[id]/finish/route';
import { POST as WRITE } from '@/app/api/orders/[id]/messages/route';
import { GET, PUT } from '@/app/api/orders/[id]/route';
import { POST } from '@/app/api/orders/route';
import { ShopItem } from '@/entities';
import type { Parameter } from '@/geometry';
import {
  checkMachine,
  checkSheet,
  machineParameters,
  sheetParameters,
  type SheetValues,
} from '@/geometry/cutting/shop-parameters';
import { orderSchema, type Order } from '@/lib/schemas/order';
import { entityManager } from './as-owner';
import { call } from './call';
import type { Cast, Caller } from './cast';

const startOf = (table: Record<string, Parameter>): Record<string, unknown> =>
  Object.fromEntries(Object.entries(table).map(([key, { default: start }]) => [key, start]));

export const addMachine = (cast: Cast) =>
  cast.item(
    'machine',
    'Bench laser',
    checkMachine({ ...startOf(machineParameters), reflective: 'yes' }),
  );

/** Brass of 0.8 mm unless said otherwise, which the default design's plates want. */
export const addSheet = (cast: Cast, values: Partial<SheetValues> = {}) =>
  cast.item('sheet', 'By the door', checkSheet({ ...startOf(sheetParameters), ...values }));

export async function sheetsLeft(id: string): Promise<number> {
  const { values } = await (await entityManager()).findOneOrFail(ShopItem, id);
  return (values as SheetValues).count;
}

/** A month from now, as YYYY-MM-DD. */
export const later = (): string =>
  new Date(Date.now() + 30 * 24 * 3_600_000).toISOString().slice(0, 10);

export const termsOf = (revision: string, sheet: string, machine: string) => ({
  ...{ revision, sheet, machine },
  ...{ quantity: 2, sheets: 1, dueOn: later(), note: 'Deburr both faces' },
});

export const place = (body: unknown) => call(POST, {}, { method: 'POST', body });
export const get = (id: string) => call(GET, { id });
export const change = (id: string, body: unknown) => call(PUT, { id }, { method: 'PUT', body });
const posting = (route: typeof BEGIN) => (id: string, body: unknown) =>
  call(route, { id }, { method: 'POST', body });
export const begin = posting(BEGIN);
export const finish = posting(FINISH);
export const cancel = posting(CANCEL);

export function formOf(
  fields: Record<string, string | number>,
  files: readonly File[] = [],
): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, String(value));
  for (const file of files) form.append('files', file);
  return form;
}

export const write = (
  id: string,
  fields: Record<string, string | number>,
  files: readonly File[] = [],
) => call(WRITE, { id }, { method: 'POST', form: formOf(fields, files) });

export async function orderIn(response: Response): Promise<Order> {
  const body: unknown = await response.json();
  const parsed = orderSchema.safeParse(body);
  if (!parsed.success) throw new Error(`no order: ${JSON.stringify(body).slice(0, 400)}`);
  return parsed.data;
}

/** An order placed by the builder, in one of the states that it can be brought to. */
export async function orderIs(
  cast: Cast,
  state: Order['state'],
  terms: ReturnType<typeof termsOf>,
  asker: Caller = 'builder',
): Promise<Order> {
  cast.ask(asker);
  const order = await orderIn(await place(terms));
  const { id } = order;
  if (state === 'cancelled') return orderIn(await cancel(id, { version: 1 }));
  if (state === 'queued') return order;
  cast.ask('machinist');
  if (state === 'returned') {
    return orderIn(await write(id, { kind: 'question', text: 'Which side up?', version: 1 }));
  }
  const begun = await orderIn(await begin(id, { version: 1 }));
  if (state === 'cutting') return begun;
  return orderIn(await finish(id, { version: 2, sheets: 1, scrap: 0 }));
}
