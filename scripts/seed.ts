/**
 * Fills an empty database with the demo workshop, once: two workshops, four people, and the
 * worked designs. Passwords are made here and written to the file named as argument, so that no
 * two installations share one. All names are invented.
 */

import { randomBytes, randomUUID } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { MikroORM, type EntityManager } from '@mikro-orm/postgresql';
import {
  Design,
  PARAMETERS_FORMAT,
  Membership,
  RecordEntry,
  ShopItem,
  User,
  Workshop,
} from '../entities';
import { checkDesign, type Parameter } from '../geometry';
import {
  checkMachine,
  checkSheet,
  machineParameters,
  sheetParameters,
} from '../geometry/cutting/shop-parameters';
import { assessmentOf } from '../lib/kernel/assessment';
import { deriveDesign } from '../lib/kernel/derive-design';
import { hashPassword } from '../lib/password';
import type { Role } from '../lib/schemas/api';
import config from '../mikro-orm.config';
import { keepVersion } from '../lib/revisions/keep-version';
import { addOrders } from './seed-orders';
import { addRevisions } from './seed-revisions';

const demo: { workshop: string; people: { name: string; email: string; role: Role }[] }[] = [
  {
    workshop: 'Larkfield Condenser Works',
    people: [
      { name: 'Maud Ferrin', email: 'maud@larkfield.example', role: 'owner' },
      { name: 'Ivo Castell', email: 'ivo@larkfield.example', role: 'builder' },
      { name: 'Petra Holm', email: 'petra@larkfield.example', role: 'machinist' },
    ],
  },
  {
    workshop: 'Tidewell Bench',
    people: [{ name: 'Nils Auber', email: 'nils@tidewell.example', role: 'owner' }],
  },
];

/** Who also lends a hand in another workshop, so that changing between two can be tried. */
const guests: { workshop: string; email: string; role: Role }[] = [
  { workshop: 'Tidewell Bench', email: 'ivo@larkfield.example', role: 'machinist' },
];

const SEED_LOCK = 80_411_908;
const examples = join(import.meta.dirname, '..', 'public', 'examples');

/** Two groups of letters and digits that can't be taken for one another; 60 bits. */
function makePassword(): string {
  const signs = 'abcdefghjkmnpqrstuvwxyz23456789x';
  const word = [...randomBytes(12)].map((byte) => signs[byte % 32]).join('');
  return `${word.slice(0, 6)}-${word.slice(6)}`;
}

function readJson(name: string): unknown {
  return JSON.parse(readFileSync(join(examples, name), 'utf8'));
}

function workedDesigns(): { name: string; design: unknown }[] {
  if (!existsSync(join(examples, 'index.json'))) return [];
  const index = readJson('index.json') as { file: string }[];
  return index.map(({ file }) => readJson(file) as { name: string; design: unknown });
}

function addDesigns(em: EntityManager, workshop: Workshop, builder: User): void {
  for (const { name, design } of workedDesigns()) {
    const parameters = checkDesign(design);
    const { kernel, checks } = assessmentOf(deriveDesign(parameters));
    const now = new Date();
    const people = { createdBy: builder, updatedBy: builder };
    const times = { createdAt: now, updatedAt: now };
    const id = randomUUID();
    const made = { id, workshop, name, parameters, kernel, checks, ...people, ...times };
    const format = { version: 1, parametersFormat: PARAMETERS_FORMAT };
    keepVersion(em, em.create(Design, { ...made, ...format }));
    em.create(RecordEntry, {
      workshop,
      who: builder,
      what: 'design-created',
      subject: id,
      detail: { name, kernel, checks },
    });
  }
}

/** Three machines and three sheets, so that a layout can be tried at once. */
function addShop(em: EntityManager, workshop: Workshop, builder: User): void {
  const start = (table: Record<string, Parameter>): Record<string, unknown> =>
    Object.fromEntries(Object.entries(table).map(([key, { default: value }]) => [key, value]));
  const add = (kind: ShopItem['kind'], name: string, values: ShopItem['values']): void => {
    const now = new Date();
    const made = { id: randomUUID(), createdAt: now, updatedAt: now, updatedBy: builder };
    em.create(ShopItem, { ...made, workshop, kind, name, values });
  };
  const machine = start(machineParameters);
  add(
    'machine',
    'Bench fibre laser',
    checkMachine({ ...machine, reflective: 'yes', bedWidth: 600, bedHeight: 400 }),
  );
  add(
    'machine',
    'Old CO₂ laser',
    checkMachine({ ...machine, kerf: 0.25, feed: 30, pierceTime: 0.8 }),
  );
  add(
    'machine',
    'Etching bath',
    checkMachine({
      ...machine,
      process: 'etching',
      kerf: 0,
      smallestHole: 1.2,
      reflective: 'yes',
      leadIn: 0,
      bridges: 2,
      bridgeWidth: 0.4,
      feed: 1,
      pierceTime: 0,
      bedWidth: 300,
      bedHeight: 300,
    }),
  );
  const sheet = start(sheetParameters);
  add('sheet', 'Brass, 0.8', checkSheet({ ...sheet, count: 12 }));
  add('sheet', 'Brass, 0.5', checkSheet({ ...sheet, thickness: 0.5, count: 6 }));
  add(
    'sheet',
    'Aluminium, 2',
    checkSheet({
      ...sheet,
      material: 'aluminium',
      thickness: 2,
      thicknessTolerance: 0.09,
      count: 4,
    }),
  );
}

async function seed(em: EntityManager, signInsFile: string): Promise<boolean> {
  await em.execute('select pg_advisory_xact_lock(?)', [SEED_LOCK]);
  if ((await em.count(Workshop)) > 0) return false;
  const signIns: Record<string, string>[] = [];
  const users = new Map<string, User>();
  const now = new Date();
  for (const { workshop: workshopName, people } of demo) {
    const workshop = em.create(Workshop, { id: randomUUID(), name: workshopName });
    for (const { name, email, role } of people) {
      const password = makePassword();
      signIns.push({ workshop: workshopName, name, email, role, password });
      const passwordHash = await hashPassword(password);
      const user = em.create(User, { id: randomUUID(), name, email, passwordHash });
      em.create(Membership, { workshop, user, role, createdAt: now });
      users.set(email, user);
      if (role === 'owner') {
        em.create(RecordEntry, {
          workshop,
          who: user,
          what: 'workshop-opened',
          subject: workshop.id,
          detail: { name: workshopName },
        });
      }
      if (role !== 'builder') continue;
      addDesigns(em, workshop, user);
      addShop(em, workshop, user);
    }
    for (const { email, role } of guests.filter((guest) => guest.workshop === workshopName)) {
      // Later than their own, which is the one that a browser opens first.
      const createdAt = new Date(now.getTime() + 1);
      em.create(Membership, { workshop, user: users.get(email)!, role, createdAt });
    }
  }
  // What is ordered is found among what is stored.
  await em.flush();
  for (const workshop of await em.find(Workshop, {})) {
    await addRevisions(em, workshop);
    await addOrders(em, workshop);
  }
  // Before the commit: passwords that were lost would leave a demo nobody can enter.
  writeFileSync(signInsFile, JSON.stringify(signIns, null, 2), { mode: 0o600 });
  return true;
}

const [signInsFile] = process.argv.slice(2);
if (!signInsFile) throw new Error('seed: name the file for the demo sign-ins');
const orm = await MikroORM.init(config);
try {
  const made = await orm.em.fork().transactional((em) => seed(em, signInsFile));
  if (made) console.log('Seeded the demo workshop');
} finally {
  await orm.close();
}
