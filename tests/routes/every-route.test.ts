/**
 * Every route and action there is on disk, by everybody. One that is not in the tables below
 * fails the test, so none can come without saying who may use it.
 */

import { randomUUID } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, test } from 'vitest';
import { defaultDesign, derive } from '@/geometry';
import { cutFiles } from '@/geometry/files';
import { machineParameters } from '@/geometry/cutting/shop-parameters';
import { partsOf } from '@/geometry/parts/assembly';
import {
  Attachment,
  CutOrder,
  OrderMessage,
  RecordEntry,
  RevisionFile,
  User,
  Workshop,
} from '@/entities';
import type { Order } from '@/lib/schemas/order';
import { entityManager } from '../support/as-owner';
import { call } from '../support/call';
import { addMachine, addSheet, formOf, orderIs, termsOf } from '../support/orders';
import { revisionOf, type RevisionState } from '../support/released';
import { rowLayout } from '../support/row-layout';
import { callers, Cast, storedDesign, type Caller } from '../support/cast';

const root = join(import.meta.dirname, '..', '..');
const methods = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'];

interface Rule {
  /** What the route is called with beside the design's id and the file's name. */
  readonly params?: (cast: Cast) => Promise<Record<string, string>>;
  readonly status: Readonly<Record<Caller, number>>;
  /** What is sent, or what makes it. */
  readonly body?: unknown;
  readonly form?: () => FormData;
  readonly query?: Record<string, string>;
  /** Puts right what the call has changed for those who come after. */
  readonly afterwards?: () => Promise<void>;
}

/** Answers in the order of `callers`: owner, builder, machinist, outsider, removed, signed out. */
function answers(
  ...statuses: [number, number, number, number, number, number]
): Rule['status'] {
  return Object.fromEntries(
    callers.map((caller, index) => [caller, statuses[index]!]),
  ) as unknown as Rule['status'];
}

const reads = answers(200, 200, 200, 404, 401, 401);
/** What is saved and not released is not for machinists. */
const draftReads = answers(200, 200, 404, 404, 401, 401);
const writes = answers(200, 200, 403, 404, 401, 401);
const change = { version: 1, name: 'Renamed', design: defaultDesign() };

const dial = {
  section: '0',
  quantity: 'frequency',
  form: 'round',
  radius: '50',
  ratio: '1',
  drum: '100',
  sense: 'clockwise',
  moves: 'pointer',
  place: 'upper',
  open: '0',
  hole: '6',
};

/** next-auth's own routes answer everybody; tests/e2e signs in and out through them. */
const nextAuth = 'app/api/auth/[...nextauth]/route.ts';

const routes: Record<string, Record<string, Rule>> = {
  'app/api/health/route.ts': { GET: { status: answers(200, 200, 200, 200, 200, 200) } },
  'app/api/record/route.ts': { GET: { status: answers(200, 200, 403, 200, 401, 401) } },
  'app/api/record/export/route.ts': { GET: { status: answers(200, 200, 403, 200, 401, 401) } },
  'app/api/live/route.ts': { GET: { status: answers(200, 200, 200, 200, 401, 401) } },
  'app/api/designs/route.ts': {
    GET: { status: answers(200, 200, 200, 200, 401, 401) },
    POST: { status: answers(201, 201, 403, 201, 401, 401), body: { name: 'New' } },
  },
  'app/api/designs/[id]/route.ts': {
    GET: { status: draftReads },
    PUT: { status: writes, body: change },
    DELETE: { status: answers(204, 204, 403, 404, 401, 401) },
  },
  'app/api/designs/[id]/dial/route.ts': { GET: { status: draftReads, query: dial } },
  'app/api/designs/[id]/files/route.ts': { GET: { status: draftReads } },
  'app/api/designs/[id]/files/[name]/route.ts': { GET: { status: draftReads } },
};

const machine = {
  name: 'Bench laser',
  values: Object.fromEntries(
    Object.entries(machineParameters).map(([key, parameter]) => [key, parameter.default]),
  ),
};
const ofMachines = () => Promise.resolve({ kind: 'machines' });
const ofOne = async (people: Cast) => {
  people.ask('builder');
  const { POST } = await import('@/app/api/shop/[kind]/route');
  const made = await call(POST, { kind: 'machines' }, { method: 'POST', body: machine });
  return { kind: 'machines', id: ((await made.json()) as { id: string }).id };
};

Object.assign(routes, {
  'app/api/shop/[kind]/route.ts': {
    GET: { params: ofMachines, status: answers(200, 200, 200, 200, 401, 401) },
    POST: {
      params: ofMachines,
      status: answers(201, 201, 403, 201, 401, 401),
      body: machine,
    },
  },
  'app/api/shop/[kind]/[id]/route.ts': {
    PUT: { params: ofOne, status: writes, body: { ...machine, version: 1 } },
    DELETE: { params: ofOne, status: answers(204, 204, 403, 404, 401, 401) },
  },
} satisfies typeof routes);

const derivation = derive(defaultDesign());
if (!derivation.ok) throw new Error('the default design has no plates');
const settings = { gap: 2, margin: 5, rotations: 1 };
const sheets = {
  version: 1,
  machine: { from: 'values', ...machine },
  copies: 1,
  settings,
  kerf: 'compensated',
  groups: rowLayout(
    partsOf(derivation.derived).filter((part) => part.kind === 'cut'),
    1,
    { width: 500, height: 300, ...settings },
  ),
};
Object.assign(routes, {
  'app/api/designs/[id]/sheets/route.ts': { POST: { status: draftReads, body: sheets } },
} satisfies typeof routes);

/** Somebody who is a member of ours for one call. */
const ofAMember = async (people: Cast) => ({ id: await people.member('builder') });
const ofAnInvitation = async (people: Cast) => ({ id: (await people.invitation()).id });
const everybodySignedIn = (status: number) =>
  answers(status, status, status, status, status, 401);
/** Whoever has opened a workshop, or ended their sessions, is as before. */
const asBefore = async () => {
  const em = await entityManager();
  await em.execute('update users set session_epoch = 0');
  await em.execute(`delete from memberships m using workshops w
    where w.id = m.workshop_id and w.name = 'Opened by a test'`);
};

Object.assign(routes, {
  'app/api/people/route.ts': { GET: { status: answers(200, 200, 200, 200, 401, 401) } },
  'app/api/people/[id]/route.ts': {
    PUT: {
      params: ofAMember,
      status: answers(204, 403, 403, 404, 401, 401),
      body: { role: 'machinist' },
    },
    DELETE: { params: ofAMember, status: answers(204, 403, 403, 404, 401, 401) },
  },
  'app/api/invitations/route.ts': {
    POST: {
      status: answers(201, 403, 403, 201, 401, 401),
      body: { email: 'asked@test.example', role: 'builder' },
    },
  },
  'app/api/invitations/[id]/route.ts': {
    DELETE: { params: ofAnInvitation, status: answers(204, 403, 403, 404, 401, 401) },
  },
  'app/api/mails/route.ts': { GET: { status: answers(200, 403, 403, 200, 401, 401) } },
  // Open to whoever holds a link from a mail; these hold none. tests/routes/people.test.ts
  'app/api/join/route.ts': {
    POST: {
      status: answers(404, 404, 404, 404, 404, 404),
      body: { secret: 'made up', name: 'Nobody', password: 'twelve or more' },
    },
  },
  'app/api/reset/route.ts': {
    POST: {
      status: answers(404, 404, 404, 404, 404, 404),
      body: { secret: 'made up', password: 'twelve or more' },
    },
  },
  'app/api/forgot/route.ts': {
    POST: {
      status: answers(204, 204, 204, 204, 204, 204),
      body: { email: 'nobody@test.example' },
    },
  },
  'app/api/account/name/route.ts': {
    PUT: { status: everybodySignedIn(200), body: { name: 'Renamed' } },
  },
  // Without the old password. tests/routes/account.test.ts
  'app/api/account/password/route.ts': {
    PUT: { status: everybodySignedIn(422), body: { password: 'twelve or more' } },
  },
  'app/api/account/sessions/route.ts': {
    DELETE: { status: everybodySignedIn(204), afterwards: asBefore },
  },
  // Without naming one of one's own. tests/routes/account.test.ts
  'app/api/account/workshop/route.ts': { POST: { status: everybodySignedIn(404) } },
  'app/api/account/workshops/route.ts': {
    POST: {
      status: everybodySignedIn(201),
      body: { workshop: 'Opened by a test' },
      afterwards: asBefore,
    },
  },
  'app/api/account/workshops/[id]/mail/route.ts': {
    PUT: {
      params: (people: Cast) => Promise.resolve({ id: people.workshopId }),
      status: answers(200, 200, 200, 404, 404, 401),
      body: { muted: ['cut'] },
    },
  },
} satisfies typeof routes);

const attachedTo = async (cast: Cast, id: string) => {
  const em = await entityManager();
  const workshop = em.getReference(Workshop, cast.workshopId);
  const author = em.getReference(User, cast.person('builder').id);
  const kept = em.create(OrderMessage, {
    id: randomUUID(),
    order: em.getReference(CutOrder, id),
    ...{ workshop, author, kind: 'remark', text: 'See' },
  });
  const attachment = em.create(Attachment, {
    id: randomUUID(),
    ...{ workshop, message: kept, name: 'a.txt', mediaType: 'text/plain' },
    ...{ bytes: 1, sha256: 'a'.repeat(64), body: Buffer.from('a') },
  });
  await em.flush();
  return attachment.id;
};
/** What our orders are placed with, made once. */
let orderTerms: Promise<ReturnType<typeof termsOf>> | undefined;
const termsIn = (cast: Cast) =>
  (orderTerms ??= (async () => {
    const revision = await revisionOf(cast, await cast.design(), 1);
    return termsOf(revision, await addSheet(cast), await addMachine(cast));
  })());
const ofAnOrder =
  (state: Order['state'] = 'queued') =>
  async (cast: Cast) => ({ id: (await orderIs(cast, state, await termsIn(cast))).id });
const remark = () => formOf({ kind: 'remark', text: 'See' });

Object.assign(routes, {
  'app/api/orders/route.ts': {
    GET: { status: answers(200, 200, 200, 200, 401, 401) },
    POST: { status: answers(201, 201, 403, 404, 401, 401), body: termsIn },
  },
  'app/api/orders/orderable/route.ts': {
    GET: { status: answers(200, 200, 403, 200, 401, 401) },
  },
  'app/api/orders/[id]/route.ts': {
    GET: { params: ofAnOrder(), status: reads },
    PUT: {
      params: ofAnOrder(),
      status: writes,
      body: async (cast: Cast) => ({ ...(await termsIn(cast)), version: 1 }),
    },
  },
  'app/api/orders/[id]/begin/route.ts': {
    POST: { params: ofAnOrder(), status: reads, body: { version: 1 } },
  },
  'app/api/orders/[id]/finish/route.ts': {
    POST: {
      params: ofAnOrder('cutting'),
      status: reads,
      body: { version: 2, sheets: 0, scrap: 0 },
    },
  },
  'app/api/orders/[id]/cancel/route.ts': {
    POST: { params: ofAnOrder(), status: writes, body: { version: 1 } },
  },
  // Who may ask and who may answer: tests/routes/orders.test.ts
  'app/api/orders/[id]/messages/route.ts': {
    POST: {
      params: ofAnOrder(),
      status: answers(201, 201, 201, 404, 401, 401),
      form: remark,
    },
  },
  'app/api/attachments/[id]/route.ts': {
    GET: {
      params: async (cast: Cast) => ({
        id: await attachedTo(cast, (await ofAnOrder()(cast)).id),
      }),
      status: reads,
    },
  },
} satisfies typeof routes);

/** A revision of ours, on its way as far as `state`. */
const ofARevision = (state: RevisionState) => async (people: Cast) => {
  const id = await revisionOf(people, await people.design(), 1, state);
  const em = await entityManager();
  const file = await em.findOneOrFail(RevisionFile, { revision: id, position: 0 });
  return { id, name: file.name };
};
const ofReleased = ofARevision('released');
Object.assign(routes, {
  'app/api/designs/[id]/history/route.ts': { GET: { status: draftReads } },
  'app/api/designs/[id]/revisions/route.ts': {
    POST: {
      status: answers(201, 201, 403, 404, 401, 401),
      body: { version: 1, name: 'First' },
    },
  },
  'app/api/designs/[id]/restore/route.ts': {
    POST: { status: writes, body: { version: 1, from: { version: 1 } } },
  },
  'app/api/revisions/[id]/route.ts': { GET: { params: ofReleased, status: reads } },
  'app/api/revisions/[id]/state/route.ts': {
    PUT: {
      params: ofReleased,
      status: writes,
      body: { to: 'withdrawn', from: 'released', reason: 'Too small' },
    },
  },
  'app/api/revisions/[id]/files/route.ts': { GET: { params: ofReleased, status: reads } },
  'app/api/revisions/[id]/files/[name]/route.ts': {
    GET: { params: ofReleased, status: reads },
  },
} satisfies typeof routes);

const actions: Record<string, readonly string[]> = {
  // Open to everybody: it makes a workshop of one's own. tests/routes/sign-up.test.ts
  'app/(account)/sign-up/actions.ts': ['signUpAction'],
};

const sourcesIn = (folder: string): string[] =>
  readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
    .filter((file) => /\.tsx?$/.test(file))
    .map((file) => join(folder, file));
const load = (file: string) =>
  import(/* @vite-ignore */ join(root, file)) as Promise<Record<string, never>>;

let cast: Cast;
let fileName: string;

beforeAll(async () => {
  cast = await Cast.gather();
  fileName = cutFiles('Bench section', derivation.derived)[0]!.name;
});

test('the tables name every route on disk, with every method', async () => {
  const found = sourcesIn('app').filter((file) => /\/route\.tsx?$/.test(file));
  expect(found.sort()).toEqual([...Object.keys(routes), nextAuth].sort());
  for (const [file, rules] of Object.entries(routes)) {
    const exported = Object.keys(await load(file)).filter((name) => methods.includes(name));
    expect({ file, methods: exported.sort() }).toEqual({
      file,
      methods: Object.keys(rules).sort(),
    });
  }
});

test('the tables name every action on disk', async () => {
  const marked = ['app', 'components', 'lib']
    .flatMap(sourcesIn)
    .filter((file) => /^\s*['"]use server['"]/m.test(readFileSync(join(root, file), 'utf8')));
  expect(marked.sort()).toEqual(Object.keys(actions).sort());
  for (const [file, names] of Object.entries(actions)) {
    expect(Object.keys(await load(file))).toEqual(names);
  }
});

for (const [file, rules] of Object.entries(routes)) {
  for (const [method, rule] of Object.entries(rules)) {
    describe(`${method} ${file.slice('app'.length, -'/route.ts'.length)}`, () => {
      for (const caller of callers) {
        const status = rule.status[caller];
        test(`answers ${status} to ${caller}`, async () => {
          const id = await cast.design();
          const before = await storedDesign(id);
          const params = { id, name: fileName, ...(await rule.params?.(cast)) };
          const em = await entityManager();
          const rows = await em.count(RecordEntry);
          const body: unknown =
            typeof rule.body === 'function' ? await rule.body(cast) : rule.body;
          const form = rule.form?.();
          cast.ask(caller);
          const handler = (await load(file))[method]!;
          const response = await call(handler, params, {
            method,
            ...(rule.query && { query: rule.query }),
            ...(body !== undefined && { body }),
            ...(form && { form }),
          });
          // A stream has no end to wait for. tests/routes/live.test.ts
          const stream = response.headers.get('content-type')?.startsWith('text/event-stream');
          if (stream) await response.body!.cancel();
          const answer = stream ? '' : await response.text();
          await rule.afterwards?.();
          expect({ status: response.status, answer: status < 400 ? '' : answer }).toEqual({
            status,
            answer: status < 400 ? '' : expect.stringContaining('"error"'),
          });
          if (status >= 400) {
            expect(answer).not.toContain(before.name);
            expect(await storedDesign(id)).toEqual(before);
            expect(await em.count(RecordEntry)).toBe(rows);
          }
        });
      }
    });
  }
}

test('an outsider sees none of our designs in the list', async () => {
  const id = await cast.design();
  const { GET } = await import('@/app/api/designs/route');
  cast.ask('outsider');
  expect(await (await call(GET, {})).text()).not.toContain(id);
  cast.ask('builder');
  expect(await (await call(GET, {})).text()).toContain(id);
});
