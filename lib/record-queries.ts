import 'server-only';
import type { EntityManager, FilterQuery, Loaded } from '@mikro-orm/postgresql';
import {
  CutOrder,
  Design,
  Invitation,
  RecordEntry,
  Revision,
  ShopItem,
  User,
  Workshop,
} from '@/entities';
import type { Viewer } from './access';
import { inWorkshop } from './db';
import { recordWords } from './record-words';
import type { RecordPage, RecordQuery, RecordRow } from './schemas/record';

/** Rows of one page. */
const PAGE = 50;

/** Rows that an export reads at a time. */
const CHUNK = 1_000;

function filterOf({ workshopId }: Viewer, query: RecordQuery): FilterQuery<RecordEntry> {
  const { who, what, subject, from, until, before } = query;
  return {
    workshop: workshopId,
    ...(who && { who }),
    ...(what && { what: what as RecordEntry['what'] }),
    ...(subject && { subject }),
    ...((from ?? until) && {
      at: { ...(from && { $gte: new Date(from) }), ...(until && { $lt: new Date(until) }) },
    }),
    ...(before && { id: { $lt: before } }),
  };
}

/** What the subjects and revisions of rows are called. */
async function namesOf(
  tx: EntityManager,
  rows: readonly RecordEntry[],
): Promise<{ subjects: Map<string, string>; revisions: Map<string, number> }> {
  const id = { $in: [...new Set(rows.map(({ subject }) => subject))] };
  const named = [
    ...(await tx.find(Design, { id }, { fields: ['name'] })),
    ...(await tx.find(ShopItem, { id }, { fields: ['name'] })),
    ...(await tx.find(User, { id }, { fields: ['name'] })),
    ...(await tx.find(Workshop, { id }, { fields: ['name'] })),
  ].map((item): [string, string] => [item.id, item.name]);
  const orders = await tx.find(CutOrder, { id }, { fields: ['number'] });
  const invitations = await tx.find(Invitation, { id }, { fields: ['email'] });
  const revisionIds = rows.flatMap(({ revision }) => revision ?? []);
  const revisions = await tx.find(
    Revision,
    { id: { $in: [...new Set(revisionIds)] } },
    { fields: ['number'] },
  );
  return {
    subjects: new Map([
      ...named,
      ...orders.map((order): [string, string] => [order.id, `Order ${order.number}`]),
      ...invitations.map((one): [string, string] => [one.id, one.email]),
    ]),
    revisions: new Map(revisions.map(({ id: key, number }) => [key, number])),
  };
}

/** A value of the record's detail on one line. */
function written(value: unknown): string {
  if (value === null || value === undefined) return 'none';
  if (typeof value === 'object') return JSON.stringify(value);
  return String(value as string | number | boolean);
}

function factsOf(detail: Record<string, unknown>): RecordRow['facts'] {
  return Object.entries(detail).flatMap(([name, value]): RecordRow['facts'] => {
    if (name !== 'changes' || !Array.isArray(value)) return [[name, written(value)]];
    return (value as { path: string; from: unknown; to: unknown }[]).map(
      ({ path, from, to }) => [path, `${written(from)} → ${written(to)}`],
    );
  });
}

async function read(
  tx: EntityManager,
  viewer: Viewer,
  query: RecordQuery,
  limit: number,
): Promise<RecordRow[]> {
  const stored: Loaded<RecordEntry, 'who'>[] = await tx.find(
    RecordEntry,
    filterOf(viewer, query),
    { populate: ['who'], orderBy: { id: 'desc' }, limit },
  );
  const { subjects, revisions } = await namesOf(tx, stored);
  return stored.map(({ id, at, who, what, subject, revision, detail }) => ({
    id,
    at: at.toISOString(),
    who: { id: who.id, name: who.name },
    what,
    did: recordWords[what],
    subject: { id: subject, name: subjects.get(subject) ?? '' },
    revision: revision ? (revisions.get(revision) ?? null) : null,
    facts: factsOf(detail),
  }));
}

/** The newest rows that fit, one page of them. */
export function recordPage(viewer: Viewer, query: RecordQuery): Promise<RecordPage> {
  return inWorkshop(viewer, async (tx) => {
    const rows = await read(tx, viewer, query, PAGE + 1);
    return { rows: rows.slice(0, PAGE), more: rows.length > PAGE };
  });
}

/** Every row that fits, newest first, some at a time. */
export async function* recordRows(
  viewer: Viewer,
  query: RecordQuery,
): AsyncGenerator<RecordRow[]> {
  let { before } = query;
  for (;;) {
    const asked = { ...query, ...(before && { before }) };
    const rows = await inWorkshop(viewer, (tx) => read(tx, viewer, asked, CHUNK));
    if (rows.length > 0) yield rows;
    if (rows.length < CHUNK) return;
    before = rows.at(-1)!.id;
  }
}

/** Everybody who is or was in the workshop. */
export function recordPeople(viewer: Viewer): Promise<{ id: string; name: string }[]> {
  return inWorkshop(viewer, async (tx) => {
    const people = await tx.find(
      User,
      {},
      { fields: ['name'], orderBy: { name: 'asc', id: 'asc' } },
    );
    return people.map(({ id, name }) => ({ id, name }));
  });
}
