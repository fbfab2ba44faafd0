import { beforeAll, describe, expect, test } from 'vitest';
import { GET as HISTORY } from '@/app/api/designs/[id]/history/route';
import { POST as RESTORE } from '@/app/api/designs/[id]/restore/route';
import { POST as NAME } from '@/app/api/designs/[id]/revisions/route';
import { GET as DESIGN, PUT as SAVE } from '@/app/api/designs/[id]/route';
import { POST as CREATE } from '@/app/api/designs/route';
import { GET as FILE } from '@/app/api/revisions/[id]/files/[name]/route';
import { GET as FILES } from '@/app/api/revisions/[id]/files/route';
import { GET as REVISION } from '@/app/api/revisions/[id]/route';
import { Revision as StoredRevision, RevisionFile } from '@/entities';
import { defaultDesign, KERNEL_VERSION, type Design } from '@/geometry';
import { hashOf } from '@/lib/kernel/hashed-file';
import { designFilesSchema, designRecordSchema } from '@/lib/schemas/api';
import { historySchema, revisionSchema, type Revision } from '@/lib/schemas/revision';
import { entityManager } from '../support/as-owner';
import { call, refusal } from '../support/call';
import { Cast } from '../support/cast';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

const withGap = (airGap: number): Design => {
  const design = defaultDesign();
  return { ...design, sections: [{ ...design.sections[0]!, airGap }] };
};

async function make(name = 'Bench section'): Promise<string> {
  cast.ask('builder');
  const made = await call(CREATE, {}, { method: 'POST', body: { name } });
  return designRecordSchema.parse(await made.json()).id;
}

const name = (id: string, version: number, words = 'First') =>
  call(NAME, { id }, { method: 'POST', body: { version, name: words, note: 'For the bench' } });

async function named(id: string, version = 1): Promise<Revision> {
  const answer = await name(id, version);
  expect(answer.status).toBe(201);
  return revisionSchema.parse(await answer.json());
}

const save = async (id: string, version: number, design: Design) => {
  const body = { version, name: 'Changed', design };
  return designRecordSchema.parse(
    await (await call(SAVE, { id }, { method: 'PUT', body })).json(),
  );
};

const historyOf = async (id: string) =>
  historySchema.parse(await (await call(HISTORY, { id })).json());

describe('saving', () => {
  test('keeps every version, newest first, and the database keeps them as they are', async () => {
    const id = await make();
    await save(id, 1, withGap(0.6));
    await save(id, 2, withGap(0.7));
    const { versions } = await historyOf(id);
    expect(versions.map(({ version, name: called }) => [version, called])).toEqual([
      [3, 'Changed'],
      [2, 'Changed'],
      [1, 'Bench section'],
    ]);
    const em = await entityManager();
    await expect(
      em.execute("update design_versions set name = 'Other' where design_id = ?", [id]),
    ).rejects.toThrow(/kept as they are/);
    await expect(
      em.execute('delete from design_versions where design_id = ?', [id]),
    ).rejects.toThrow(/kept as they are/);
  });

  test('a restored version becomes the newest, and nothing is lost', async () => {
    const id = await make();
    await save(id, 1, withGap(0.6));
    const body = { version: 2, from: { version: 1 } };
    const answer = await call(RESTORE, { id }, { method: 'POST', body });
    const record = designRecordSchema.parse(await answer.json());
    expect(record).toMatchObject({
      version: 3,
      name: 'Bench section',
      design: defaultDesign(),
    });
    expect((await historyOf(id)).versions).toHaveLength(3);
    expect((await cast.record(id)).at(-1)).toMatchObject({
      what: 'design-restored',
      detail: { version: 3, from: { version: 1 } },
    });
    const again = await call(RESTORE, { id }, { method: 'POST', body });
    expect(again.status).toBe(409);
    const none = { version: 3, from: { version: 44 } };
    expect((await call(RESTORE, { id }, { method: 'POST', body: none })).status).toBe(404);
  });
});

describe('a named revision', () => {
  test('freezes parameters, what the kernel said, and every file with its hash', async () => {
    const id = await make('Kept');
    const revision = await named(id);
    expect(revision).toMatchObject({
      number: 1,
      state: 'draft',
      version: 1,
      kernel: KERNEL_VERSION,
      designName: 'Kept',
      createdBy: { name: 'Test builder' },
    });
    await save(id, 1, withGap(0.8));

    const files = designFilesSchema.parse(
      await (await call(FILES, { id: revision.id })).json(),
    );
    expect(files.files.map(({ kind }) => kind)).toEqual(
      expect.arrayContaining(['dxf', 'svg', 'pdf', 'zip', 'csv']),
    );
    for (const { name: file, sha256, bytes } of files.files) {
      const answer = await call(FILE, { id: revision.id, name: file });
      const body = new Uint8Array(await answer.arrayBuffer());
      expect([body.byteLength, hashOf(body)]).toEqual([bytes, sha256]);
    }
    const em = await entityManager();
    const stored = await em.findOneOrFail(StoredRevision, revision.id);
    expect(stored.parameters).toEqual(defaultDesign());
    expect(stored.derivation.ok).toBe(true);
  });

  test('gets the next number, also when two are named at once', async () => {
    const id = await make();
    const answers = await Promise.all([name(id, 1, 'One'), name(id, 1, 'Two')]);
    expect(answers.map(({ status }) => status)).toEqual([201, 201]);
    const { revisions } = await historyOf(id);
    expect(revisions.map(({ number }) => number)).toEqual([2, 1]);
  });

  test('is refused over an older version, and without plates', async () => {
    const id = await make();
    await save(id, 1, withGap(0.8));
    expect((await name(id, 1)).status).toBe(409);
    const impossible = defaultDesign();
    Object.assign(impossible.sections[0]!, {
      targetKind: 'terminals',
      maxCapacitance: 40e-9,
    });
    impossible.largestRadius = 20;
    await save(id, 2, impossible);
    const answer = await name(id, 3);
    expect(answer.status).toBe(422);
    expect((await refusal(answer)).code).toBe('checks-fail');
    expect((await historyOf(id)).revisions).toEqual([]);
  });

  test('can not be changed, not even by the owner of the tables', async () => {
    const { id } = await named(await make());
    const em = await entityManager();
    for (const change of [
      "parameters = '{}'",
      "derivation = '{}'",
      "kernel = 'x'",
      'number = 7',
      "name = 'Other'",
    ]) {
      await expect(
        em.execute(`update revisions set ${change} where id = ?`, [id]),
      ).rejects.toThrow(/frozen/);
    }
    await expect(em.execute('delete from revisions where id = ?', [id])).rejects.toThrow(
      /kept as they are/,
    );
    await expect(
      em.execute("update revisions set state = 'released' where id = ?", [id]),
    ).rejects.toThrow(/can not go from draft to released/);
    await expect(
      em.execute("update revision_files set body = 'x' where revision_id = ?", [id]),
    ).rejects.toThrow(/fixed/);
  });

  test('is another workshop’s to nobody', async () => {
    const designId = await make();
    const { id } = await named(designId);
    const files = await (await entityManager()).find(RevisionFile, { revision: id });
    cast.ask('outsider');
    expect((await call(REVISION, { id })).status).toBe(404);
    expect((await call(FILES, { id })).status).toBe(404);
    expect((await call(FILE, { id, name: files[0]!.name })).status).toBe(404);
    expect((await call(HISTORY, { id: designId })).status).toBe(404);
    expect((await call(DESIGN, { id: designId })).status).toBe(404);
    const theirs = await call(CREATE, {}, { method: 'POST', body: { name: 'Theirs' } });
    const own = designRecordSchema.parse(await theirs.json());
    // A revision of ours does not become theirs through a design of theirs.
    const swapped = { version: 1, from: { revision: id } };
    expect(
      (await call(RESTORE, { id: own.id }, { method: 'POST', body: swapped })).status,
    ).toBe(404);
  });
});
