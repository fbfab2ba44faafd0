/** A cut order from being placed to being cut, and everything that is refused on the way. */

import { beforeAll, describe, expect, test } from 'vitest';
import { GET as LIST } from '@/app/api/orders/route';
import { GET as ORDERABLE } from '@/app/api/orders/orderable/route';
import { PUT as SAVE_ITEM } from '@/app/api/shop/[kind]/[id]/route';
import { Mail, Membership } from '@/entities';
import { apiErrorSchema } from '@/lib/schemas/api';
import { orderableSchema, orderListSchema, orderSchema } from '@/lib/schemas/order';
import { entityManager } from '../support/as-owner';
import { call, refusal } from '../support/call';
import { Cast, type Caller } from '../support/cast';
import {
  addMachine,
  addSheet,
  begin,
  cancel,
  change,
  finish,
  get,
  later,
  orderIn,
  orderIs,
  place,
  sheetsLeft,
  termsOf,
  write,
} from '../support/orders';
import { moveRevision, revisionOf } from '../support/released';

let cast: Cast;
let machine: string;
let brass: string;
let design: string;
let revision: string;
let terms: ReturnType<typeof termsOf>;

beforeAll(async () => {
  cast = await Cast.gather();
  machine = await addMachine(cast);
  brass = await addSheet(cast, { count: 1000 });
  design = await cast.design();
  revision = await revisionOf(cast, design, 1);
  terms = termsOf(revision, brass, machine);
});

const saysNo = async (response: Response, status = 422) => {
  expect(response.status).toBe(status);
  return (await refusal(response)).message;
};
const mailsOf = async (event: string) =>
  (await entityManager()).find(Mail, { event: { $like: `${event}%` } });

describe('placing', () => {
  test('makes a queued order that says which parts it covers, and tells the machinists', async () => {
    cast.ask('builder');
    const response = await place(terms);
    expect(response.status).toBe(201);
    const order = await orderIn(response);
    expect(order).toMatchObject({
      state: 'queued',
      version: 1,
      quantity: 2,
      revision: { id: revision, number: 1, state: 'released' },
      orderedBy: { id: cast.person('builder').id },
      takenBy: null,
      hindrance: null,
    });
    expect(order.parts.map(({ label, quantity }) => [label, quantity])).toEqual([
      ['Rotor plate, section 1', 14],
      ['Stator plate, section 1', 15],
    ]);
    expect(order.otherParts.map(({ label, sheet }) => `${label}: ${sheet}`)).toEqual([
      'Front plate: 2 mm Aluminium EN AW-5754',
      'Back plate: 2 mm Aluminium EN AW-5754',
      'Arm of the stop: 2 mm Steel DC01',
    ]);
    expect(order.files.map(({ kind, name }) => [kind, /s1-[a-z]+/.exec(name)?.[0]])).toEqual([
      ['dxf', 's1-rotor'],
      ['dxf', 's1-stator'],
    ]);
    const [row] = await cast.record(order.id);
    expect(row).toMatchObject({ what: 'order-placed', revision, detail: { sheets: 1 } });
    const mails = await mailsOf(`order-placed:${order.id}`);
    expect(mails.map(({ toAddress }) => toAddress)).toEqual([
      expect.stringContaining('machinist'),
    ]);
    expect(mails[0]!.text).toContain('Deburr both faces');
  });

  test('numbers without a gap, however many order at once, refused ones among them', async () => {
    cast.ask('builder');
    const { number: first } = await orderIn(await place(terms));
    const answers = await Promise.all(
      Array.from({ length: 12 }, (_, index) =>
        place(index % 3 === 0 ? { ...terms, dueOn: '2020-01-01' } : terms),
      ),
    );
    const numbers = await Promise.all(
      answers
        .filter(({ status }) => status === 201)
        .map(async (one) => (await orderIn(one)).number),
    );
    expect(numbers.sort((a, b) => a - b)).toEqual(
      Array.from({ length: 8 }, (_, index) => first + 1 + index),
    );
  });

  test.each(['draft', 'in-review', 'superseded', 'withdrawn'] as const)(
    'a revision that is %s is refused',
    async (state) => {
      const other = await revisionOf(cast, await cast.design(), 1, state);
      cast.ask('builder');
      expect(await saysNo(await place({ ...terms, revision: other }))).toContain(
        `is ${state.replace('-', ' ')}; only a released revision`,
      );
    },
  );

  test('sheet that no part wants is refused, naming both', async () => {
    cast.ask('builder');
    for (const [values, words] of [
      [{ thickness: 1 }, '1 mm Brass CuZn37'],
      [{ material: 'copper' }, '0.8 mm Copper Cu-ETP'],
    ] as const) {
      const sheet = await addSheet(cast, values);
      const message = await saysNo(await place({ ...terms, sheet }));
      expect(message).toContain(words);
      expect(message).toContain(
        '0.8 mm Brass CuZn37, 2 mm Aluminium EN AW-5754 and 2 mm Steel DC01',
      );
    }
  });

  test.each([
    [{ quantity: 0 }, 'quantity', '1 to 10000'],
    [{ quantity: 1.5 }, 'quantity', 'whole'],
    [{ quantity: '2' }, 'quantity', 'whole'],
    [{ sheets: -1 }, 'sheets', '0 to 10000'],
    [{ dueOn: '31.3.2027' }, 'dueOn', '2026-03-31'],
    [{ dueOn: '2027-02-30' }, 'dueOn', 'not a day'],
    [{ dueOn: '2020-01-01' }, 'dueOn', 'has passed'],
    [{ note: 'x'.repeat(501) }, 'note', '500'],
    [{ machine: 'the laser' }, 'machine', 'choose'],
    [{ revision: undefined }, 'revision', 'choose'],
  ])('%j is refused with its field', async (bad, field, words) => {
    cast.ask('builder');
    const response = await place({ ...terms, ...bad });
    const error = await refusal(response);
    expect(error).toMatchObject({ code: 'bad-input', field });
    expect(error.message).toContain(words);
  });

  test('a sheet for a machine, or another workshop’s, is not found', async () => {
    const theirs = await (await Cast.gather()).item('sheet', 'Theirs', {} as never);
    cast.ask('builder');
    for (const ids of [
      { sheet: machine, machine: brass },
      { sheet: theirs },
      { machine: theirs },
    ]) {
      expect(await saysNo(await place({ ...terms, ...ids }), 404)).toMatch(
        /^No such (sheet|machine)/,
      );
    }
  });
});

describe('a whole life', () => {
  test('queued, begun, asked, answered, begun again, cut: recorded, mailed and drawn from the store', async () => {
    const sheet = await addSheet(cast, { count: 5 });
    const { id, number } = await orderIs(cast, 'queued', { ...terms, sheet });
    cast.ask('machinist');
    const begun = await orderIn(await begin(id, { version: 1 }));
    expect(begun).toMatchObject({
      state: 'cutting',
      version: 2,
      takenBy: { id: cast.person('machinist').id },
    });
    const returned = await orderIn(
      await write(id, { kind: 'question', text: 'Film up or down?', version: 2 }),
    );
    expect(returned).toMatchObject({ state: 'returned', version: 3 });
    const question = returned.messages.at(-1)!;
    expect(question).toMatchObject({ kind: 'question', text: 'Film up or down?' });
    expect((await mailsOf(`order-asked:${question.id}`)).map((mail) => mail.toAddress)).toEqual(
      [expect.stringContaining('builder')],
    );

    // Another than who ordered may answer; who asked is told.
    cast.ask('owner');
    const answered = await orderIn(
      await write(id, { kind: 'answer', text: 'Up.', version: 3 }),
    );
    expect(answered).toMatchObject({ state: 'queued', version: 4, takenBy: null });
    const answer = answered.messages.at(-1)!;
    expect((await mailsOf(`order-answered:${answer.id}`)).map((m) => m.toAddress)).toEqual([
      expect.stringContaining('machinist'),
    ]);

    cast.ask('machinist');
    await begin(id, { version: 4 });
    const cut = await orderIn(
      await finish(id, { version: 5, sheets: 3, scrap: 2, actualKerf: 0.19 }),
    );
    expect(cut).toMatchObject({ state: 'cut', sheets: 3, scrap: 2, actualKerf: 0.19 });
    expect(cut.sheet).toMatchObject({ version: 2, values: { count: 2 } });
    expect(cut.machine.values.kerf).toBe(0.15);
    expect(await mailsOf(`order-cut:${id}`)).toHaveLength(1);
    expect((await cast.record(id)).map(({ what }) => what)).toEqual([
      'order-placed',
      'order-begun',
      'order-returned',
      'order-answered',
      'order-begun',
      'order-cut',
    ]);
    const [drawn] = await cast.record(sheet);
    expect(drawn).toMatchObject({
      what: 'stock-drawn',
      revision,
      detail: { order: number, sheets: 3, from: 5, to: 2 },
    });
  });

  test('the measured kerf goes into the machine’s profile by an ordinary save', async () => {
    const own = await addMachine(cast);
    const { id } = await orderIs(cast, 'cutting', { ...terms, machine: own });
    const cut = await orderIn(
      await finish(id, { version: 2, sheets: 1, scrap: 0, actualKerf: 0.2 }),
    );
    const { name, version, values } = cut.machine;
    const body = { name, version, values: { ...values, kerf: cut.actualKerf } };
    const save = () => call(SAVE_ITEM, { kind: 'machines', id: own }, { method: 'PUT', body });
    expect((await save()).status).toBe(403);
    cast.ask('builder');
    expect((await save()).status).toBe(200);
    expect((await orderIn(await get(id))).machine.values.kerf).toBe(0.2);
    expect((await save()).status).toBe(409);
  });

  test('it can be changed while nobody cuts it', async () => {
    const { id } = await orderIs(cast, 'queued', terms);
    cast.ask('builder');
    const asked = { ...terms, version: 1, quantity: 5, note: '' };
    const changed = await orderIn(await change(id, asked));
    expect(changed).toMatchObject({ version: 2, quantity: 5, note: '' });
    const same = await orderIn(await change(id, { ...asked, version: 2 }));
    expect(same.version).toBe(2);
    const rows = await cast.record(id);
    expect(rows.map(({ what }) => what)).toEqual(['order-placed', 'order-changed']);
    expect(rows[1]!.detail.changes).toEqual([
      { path: 'quantity', from: 2, to: 5 },
      { path: 'note', from: 'Deburr both faces', to: '' },
    ]);
  });

  test('a remark may be written by everybody, in every state, and moves nothing', async () => {
    for (const state of ['queued', 'cutting', 'returned', 'cut', 'cancelled'] as const) {
      const order = await orderIs(cast, state, terms);
      for (const caller of ['owner', 'builder', 'machinist'] as const) {
        cast.ask(caller);
        const response = await write(order.id, { kind: 'remark', text: `Seen by ${caller}` });
        expect(response.status).toBe(201);
        expect(await orderIn(response)).toMatchObject({ state, version: order.version });
      }
    }
  });
});

describe('a move from a state that does not allow it is refused and changes nothing', () => {
  const moves: Record<
    string,
    { by: Caller; from: string[]; go: (id: string, version: number) => Promise<Response> }
  > = {
    begin: { by: 'machinist', from: ['queued'], go: (id, version) => begin(id, { version }) },
    return: {
      by: 'machinist',
      from: ['queued', 'cutting'],
      go: (id, version) => write(id, { kind: 'question', text: 'Why?', version }),
    },
    answer: {
      by: 'builder',
      from: ['returned'],
      go: (id, version) => write(id, { kind: 'answer', text: 'So.', version }),
    },
    finish: {
      by: 'machinist',
      from: ['cutting'],
      go: (id, version) => finish(id, { version, sheets: 1, scrap: 0 }),
    },
    cancel: {
      by: 'builder',
      from: ['queued', 'cutting', 'returned'],
      go: (id, version) => cancel(id, { version }),
    },
    change: {
      by: 'builder',
      from: ['queued', 'returned'],
      go: (id, version) => change(id, { ...terms, version, quantity: 9 }),
    },
  };
  const states = ['queued', 'cutting', 'returned', 'cut', 'cancelled'] as const;
  for (const [name, { by, from, go }] of Object.entries(moves)) {
    for (const state of states) {
      const allowed = from.includes(state);
      test(`${name} from ${state}: ${allowed ? 'done' : 'refused'}`, async () => {
        const order = await orderIs(cast, state, terms);
        const left = await sheetsLeft(brass);
        cast.ask(by);
        if (allowed) {
          const stale = await go(order.id, order.version + 1);
          expect(stale.status).toBe(409);
          const { current } = apiErrorSchema.parse(await stale.json());
          expect(orderSchema.parse(current)).toMatchObject({ id: order.id, state });
          const done = await go(order.id, order.version);
          expect(done.status).toBeLessThan(300);
          expect((await orderIn(done)).version).toBe(order.version + 1);
          return;
        }
        const rows = (await cast.record(order.id)).length;
        const answer = await saysNo(await go(order.id, order.version));
        expect(answer).toContain(`is ${state}; only one that is ${from.join(' or ')}`);
        cast.ask(by);
        expect(await orderIn(await get(order.id))).toMatchObject({
          state,
          version: order.version,
          messages: order.messages,
        });
        expect(await cast.record(order.id)).toHaveLength(rows);
        expect(await sheetsLeft(brass)).toBe(left);
      });
    }
  }
});

describe('the store', () => {
  test('two that finish at once never take more than there is', async () => {
    const sheet = await addSheet(cast, { count: 3 });
    const orders = await Promise.all(
      [0, 1].map(() => orderIs(cast, 'cutting', { ...terms, sheet })),
    );
    cast.ask('machinist');
    const answers = await Promise.all(
      orders.map(({ id }) => finish(id, { version: 2, sheets: 2, scrap: 0 })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 422]);
    const refused = answers.find(({ status }) => status === 422)!;
    expect((await refusal(refused)).message).toContain('2 needed, and 1 of By the door');
    expect(await sheetsLeft(sheet)).toBe(1);
    expect((await cast.record(sheet)).map(({ what }) => what)).toEqual(['stock-drawn']);
  });

  test('the same order finished twice at once is cut once', async () => {
    const sheet = await addSheet(cast, { count: 9 });
    const { id } = await orderIs(cast, 'cutting', { ...terms, sheet });
    cast.ask('machinist');
    const body = { version: 2, sheets: 2, scrap: 0 };
    const answers = await Promise.all([finish(id, body), finish(id, body), finish(id, body)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
    expect(await sheetsLeft(sheet)).toBe(7);
    expect(await mailsOf(`order-cut:${id}`)).toHaveLength(1);
  });

  test('none used draws nothing; sheet that has left the store is said', async () => {
    const sheet = await addSheet(cast, { count: 0 });
    const { id } = await orderIs(cast, 'cutting', { ...terms, sheet });
    cast.ask('machinist');
    const body = { version: 2, scrap: 0 };
    expect(await saysNo(await finish(id, { ...body, sheets: 1 }))).toContain(
      '0 of By the door',
    );
    const em = await entityManager();
    await em.execute('update shop_items set deleted_at = now() where id = ?', [sheet]);
    expect(await saysNo(await finish(id, { ...body, sheets: 1 }))).toContain(
      'no longer in the store',
    );
    expect((await finish(id, { ...body, sheets: 0 })).status).toBe(200);
    expect(await cast.record(sheet)).toEqual([]);
  });

  test('the table itself refuses to go below empty', async () => {
    const em = await entityManager();
    const below = em.execute(
      `update shop_items set "values" = jsonb_set("values", '{count}', '-1') where id = ?`,
      [brass],
    );
    await expect(below).rejects.toThrow('shop_items_count_check');
  });

  test.each([
    [{ sheets: 1.5 }, 'sheets'],
    [{ scrap: -1 }, 'scrap'],
    [{ actualKerf: '0.2' }, 'actualKerf'],
    [{ version: undefined }, 'version'],
  ])('%j is refused with its field', async (bad, field) => {
    const { id } = await orderIs(cast, 'cutting', terms);
    cast.ask('machinist');
    const response = await finish(id, { version: 2, sheets: 1, scrap: 0, ...bad });
    expect(await refusal(response)).toMatchObject({ code: 'bad-input', field });
  });

  test('a kerf that no machine has is refused', async () => {
    const { id } = await orderIs(cast, 'cutting', terms);
    cast.ask('machinist');
    const body = { version: 2, sheets: 1, scrap: 0 };
    for (const actualKerf of [-0.1, 11]) {
      expect(await saysNo(await finish(id, { ...body, actualKerf }))).toContain('0 to 10 mm');
    }
  });
});

describe('a revision that is no longer the one to cut', () => {
  test.each(['withdrawn', 'superseded'] as const)(
    '%s: it is said; not begun, finished or changed; cancelled and ordered anew',
    async (state) => {
      const own = await cast.design();
      const old = await revisionOf(cast, own, 1);
      const sheet = await addSheet(cast, { count: 4 });
      const of = { ...terms, revision: old, sheet };
      const queued = await orderIs(cast, 'queued', of);
      const cutting = await orderIs(cast, 'cutting', of);
      const done = await orderIs(cast, 'cut', of);
      await moveRevision(old, [state]);
      const next = await revisionOf(cast, own, 2);

      cast.ask('machinist');
      const reason =
        state === 'withdrawn' ? 'withdrawn (hole too small)' : 'superseded by revision 2';
      expect(await orderIn(await get(queued.id))).toMatchObject({
        revision: { state },
        hindrance: expect.stringContaining(reason),
        successor: { id: next, number: 2 },
        files: [],
      });
      expect((await orderIn(await get(done.id))).hindrance).toBeNull();
      expect(await saysNo(await begin(queued.id, { version: 1 }))).toContain(reason);
      const finishing = { version: 2, sheets: 1, scrap: 0 };
      expect(await saysNo(await finish(cutting.id, finishing))).toContain(reason);
      expect(await sheetsLeft(sheet)).toBe(3);

      cast.ask('builder');
      expect(await saysNo(await change(queued.id, { ...of, version: 1 }))).toContain(reason);
      expect((await cancel(queued.id, { version: 1 })).status).toBe(200);
      expect((await cancel(cutting.id, { version: 2 })).status).toBe(200);
      expect((await place({ ...of, revision: next })).status).toBe(201);
    },
  );

  test('withdrawn while it is being finished: either comes wholly before the other', async () => {
    const old = await revisionOf(cast, await cast.design(), 1);
    const { id } = await orderIs(cast, 'cutting', { ...terms, revision: old });
    cast.ask('machinist');
    const em = await entityManager();
    await em.begin();
    await em.execute(
      `update revisions set state = 'withdrawn', withdrawn_reason = 'late' where id = ?`,
      [old],
    );
    const finishing = finish(id, { version: 2, sheets: 1, scrap: 0 });
    // Gives it time to come as far as the revision that is being withdrawn.
    await new Promise((resolve) => setTimeout(resolve, 300));
    await em.commit();
    expect(await saysNo(await finishing)).toContain('withdrawn (late)');
  });
});

describe('who may', () => {
  test('a machinist neither orders, changes, answers nor cancels', async () => {
    const { id, version } = await orderIs(cast, 'returned', terms);
    cast.ask('machinist');
    const answers = [
      await place(terms),
      await change(id, { ...terms, version }),
      await write(id, { kind: 'answer', text: 'Yes', version }),
      await cancel(id, { version }),
      await call(ORDERABLE, {}),
    ];
    expect(answers.map(({ status }) => status)).toEqual([403, 403, 403, 403, 403]);
    expect((await orderIn(await get(id))).state).toBe('returned');
  });

  test('to another workshop an order is not there, with every verb', async () => {
    const { id, version } = await orderIs(cast, 'queued', terms);
    const others = await Cast.gather();
    for (const caller of ['owner', 'builder', 'machinist'] as const) {
      others.ask(caller);
      const answers = [await get(id), await write(id, { kind: 'remark', text: 'Hello' })];
      answers.push(await begin(id, { version }));
      answers.push(await finish(id, { version, sheets: 0, scrap: 0 }));
      answers.push(await write(id, { kind: 'question', text: 'Hello?', version }));
      if (caller !== 'machinist') {
        answers.push(await change(id, { ...terms, version }), await cancel(id, { version }));
        answers.push(await place(terms));
      }
      expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([404]));
      expect(await (await call(LIST, {})).text()).not.toContain(id);
    }
  });

  test('the wrong kind of id, or none, is not found', async () => {
    cast.ask('owner');
    for (const id of [revision, design, brass, 'null', '']) {
      const answers = [
        await get(id),
        await begin(id, { version: 1 }),
        await cancel(id, { version: 1 }),
        await write(id, { kind: 'remark', text: 'Hello' }),
      ];
      expect(answers.map(({ status }) => status)).toEqual([404, 404, 404, 404]);
    }
  });

  test('whoever was made a machinist meanwhile no longer cancels', async () => {
    const { id } = await orderIs(cast, 'queued', terms);
    const em = await entityManager();
    const mine = { user: cast.person('builder').id, workshop: cast.workshopId };
    await em.nativeUpdate(Membership, mine, { role: 'machinist' });
    cast.ask('builder');
    const answer = await cancel(id, { version: 1 });
    await em.nativeUpdate(Membership, mine, { role: 'builder' });
    expect(answer.status).toBe(403);
  });
});

describe('lists', () => {
  test('the queue has what is open by due date, with files, then what is done with, without', async () => {
    const soon = new Date(Date.now() + 24 * 3_600_000).toISOString().slice(0, 10);
    const first = await orderIs(cast, 'queued', { ...terms, dueOn: soon });
    const done = await orderIs(cast, 'cut', terms);
    cast.ask('machinist');
    const { orders } = orderListSchema.parse(await (await call(LIST, {})).json());
    expect(orders[0]!.id).toBe(first.id);
    expect(orders[0]!.files).toHaveLength(2);
    expect(orders.find(({ id }) => id === done.id)!.files).toEqual([]);
    const open = orders.filter(({ state }) => state !== 'cut' && state !== 'cancelled');
    expect(orders.slice(0, open.length)).toEqual(open);
    const days = open.map(({ dueOn }) => dueOn);
    expect(days).toEqual([...days].sort());
    expect(days.at(-1)).toBe(later());
  });

  test('what can be ordered is what is released, with the sheets that it wants', async () => {
    cast.ask('builder');
    const { revisions } = orderableSchema.parse(await (await call(ORDERABLE, {})).json());
    expect(new Set(revisions.map(({ state }) => state))).toEqual(new Set(['released']));
    const ours = revisions.find(({ id }) => id === revision)!;
    expect(ours.wants.map(({ sheet, parts }) => [sheet, parts.length])).toEqual([
      ['0.8 mm Brass CuZn37', 2],
      ['2 mm Aluminium EN AW-5754', 2],
      ['2 mm Steel DC01', 1],
    ]);
  });
});
