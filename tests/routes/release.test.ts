import { beforeAll, describe, expect, test } from 'vitest';
import { GET as DIAL } from '@/app/api/designs/[id]/dial/route';
import { GET as DRAFT_FILES } from '@/app/api/designs/[id]/files/route';
import { POST as NAME } from '@/app/api/designs/[id]/revisions/route';
import { GET as DESIGN } from '@/app/api/designs/[id]/route';
import { GET as LIST, POST as CREATE } from '@/app/api/designs/route';
import { GET as FILE } from '@/app/api/revisions/[id]/files/[name]/route';
import { GET as FILES } from '@/app/api/revisions/[id]/files/route';
import { GET as REVISION } from '@/app/api/revisions/[id]/route';
import { PUT as MOVE } from '@/app/api/revisions/[id]/state/route';
import { Mail } from '@/entities';
import { defaultDesign, derive, type Design } from '@/geometry';
import { designFilesSchema, designListSchema, designRecordSchema } from '@/lib/schemas/api';
import { designState } from '@/lib/revisions/design-state';
import {
  revisionSchema,
  type MoveRevision,
  type Revision,
  type RevisionState,
} from '@/lib/schemas/revision';
import { entityManager } from '../support/as-owner';
import { call, refusal } from '../support/call';
import { Cast, type Caller } from '../support/cast';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

async function make(design?: Design): Promise<string> {
  cast.ask('builder');
  const body = { name: 'Bench section', ...(design && { design }) };
  const made = await call(CREATE, {}, { method: 'POST', body });
  return designRecordSchema.parse(await made.json()).id;
}

async function named(designId: string): Promise<Revision> {
  cast.ask('builder');
  const body = { version: 1, name: 'First' };
  const answer = await call(NAME, { id: designId }, { method: 'POST', body });
  return revisionSchema.parse(await answer.json());
}

const move = (id: string, body: MoveRevision, who: Caller = 'builder') => {
  cast.ask(who);
  return call(MOVE, { id }, { method: 'PUT', body });
};

async function inReview(designId: string): Promise<Revision> {
  const { id } = await named(designId);
  const answer = await move(id, { to: 'in-review', from: 'draft' });
  expect(answer.status).toBe(200);
  return revisionSchema.parse(await answer.json());
}

async function released(designId: string, who: Caller = 'owner'): Promise<Revision> {
  const { id } = await inReview(designId);
  const answer = await move(id, { to: 'released', from: 'in-review' }, who);
  expect(answer.status).toBe(200);
  return revisionSchema.parse(await answer.json());
}

const filesOf = async (id: string) =>
  designFilesSchema.parse(await (await call(FILES, { id })).json()).files;

const bytesOf = async (id: string, name: string) =>
  Buffer.from(await (await call(FILE, { id, name })).arrayBuffer());

/** Fails a check and can be cut all the same. */
function tooDeep(): Design {
  return { ...defaultDesign(), largestDepth: 20 };
}

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

describe('the way of a revision', () => {
  test('leads through review; sent back, it may be asked for again', async () => {
    const { id } = await named(await make());
    expect((await move(id, { to: 'released', from: 'draft' }, 'owner')).status).toBe(422);
    expect((await move(id, { to: 'in-review', from: 'draft' })).status).toBe(200);
    const back = { to: 'draft', from: 'in-review', reason: 'The hole is too small' } as const;
    expect((await move(id, back, 'owner')).status).toBe(200);
    expect((await move(id, back, 'owner')).status).toBe(409);
    expect((await move(id, { to: 'in-review', from: 'draft' })).status).toBe(200);
    expect((await move(id, { to: 'released', from: 'in-review' }, 'owner')).status).toBe(200);
  });

  test('the released one takes the place of the one before', async () => {
    const designId = await make();
    const first = await released(designId);
    const second = await released(designId);
    cast.ask('owner');
    const read = async (id: string) =>
      revisionSchema.parse(await (await call(REVISION, { id })).json()).state;
    expect([await read(first.id), await read(second.id)]).toEqual(['superseded', 'released']);
    const whats = (await cast.record(designId)).map(({ what }) => what);
    expect(whats.slice(-2)).toEqual(['revision-superseded', 'revision-released']);
  });

  test('two releases at once: one of them', async () => {
    const { id } = await inReview(await make());
    cast.ask('owner');
    const body = { to: 'released', from: 'in-review' };
    const both = await Promise.all([
      call(MOVE, { id }, { method: 'PUT', body }),
      call(MOVE, { id }, { method: 'PUT', body }),
    ]);
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  test('tells the others once', async () => {
    const { id } = await released(await make());
    const em = await entityManager();
    const mails = await em.find(Mail, { event: `revision-released:${id}` });
    expect(mails.map(({ toAddress }) => toAddress.split('-')[0]).sort()).toEqual([
      'builder',
      'machinist',
    ]);
  });
});

describe('a check that fails', () => {
  test('needs the owner’s word, with a reason, which is in record and manifest', async () => {
    const derivation = derive(tooDeep());
    if (!derivation.ok) throw new Error('meant to have plates');
    const failing = derivation.derived.findings.filter(({ severity }) => severity === 'fail');
    expect(failing.length).toBeGreaterThan(0);

    const designId = await make(tooDeep());
    const { id } = await inReview(designId);
    const bare = await move(id, { to: 'released', from: 'in-review' }, 'owner');
    expect(bare.status).toBe(422);
    expect((await refusal(bare)).code).toBe('checks-fail');

    const waivers = failing.map(({ code, section, label }) => ({
      code,
      section,
      label,
      reason: 'The bench has room',
    }));
    const body = { to: 'released', from: 'in-review', waivers } as const;
    expect((await move(id, body, 'builder')).status).toBe(403);
    const answer = await move(id, body, 'owner');
    const revision = revisionSchema.parse(await answer.json());
    expect(revision).toMatchObject({ state: 'released' });
    expect(revision.waivers).toHaveLength(failing.length);
    expect(revision.waivers[0]).toMatchObject({
      reason: 'The bench has room',
      by: 'Test owner',
    });
    const last = (await cast.record(designId)).at(-1)!;
    expect(JSON.stringify(last.detail)).toContain('The bench has room');
  });
});

test('each check that fails needs a word of its own, also two of one code', async () => {
  const [section] = defaultDesign().sections;
  const design: Design = {
    ...defaultDesign(),
    frameClearance: 1,
    sections: [section!, { ...section!, airGap: 1.5 * section!.airGap }],
  };
  const derivation = derive(design);
  if (!derivation.ok) throw new Error('meant to have plates');
  const failing = derivation.derived.findings.filter(({ severity }) => severity === 'fail');
  const frame = failing.filter(({ code }) => code === 'frame');
  expect(frame).toHaveLength(2);

  const { id } = await inReview(await make(design));
  const waivers = failing.map(({ code, section: of, label }) => ({
    code,
    section: of,
    label,
    reason: `Seen: ${label}`,
  }));
  const without = waivers.filter(({ label }) => label !== frame[1]!.label);
  const silent = await move(
    id,
    { to: 'released', from: 'in-review', waivers: without },
    'owner',
  );
  expect(silent.status).toBe(422);
  expect((await refusal(silent)).message).toContain(frame[1]!.label);
  const answer = await move(id, { to: 'released', from: 'in-review', waivers }, 'owner');
  const revision = revisionSchema.parse(await answer.json());
  expect(revision.waivers.map(({ reason }) => reason)).toEqual(
    failing.map(({ label }) => `Seen: ${label}`),
  );
});

describe('what is released', () => {
  test('stays as it is, byte for byte, whatever becomes of the design', async () => {
    const designId = await make();
    const { id } = await released(designId);
    const files = await filesOf(id);
    const before = await Promise.all(files.map(({ name }) => bytesOf(id, name)));
    const after = await Promise.all(files.map(({ name }) => bytesOf(id, name)));
    expect(after).toEqual(before);
    const em = await entityManager();
    await expect(
      em.execute('delete from revision_files where revision_id = ?', [id]),
    ).rejects.toThrow(/fixed/);
    await expect(
      em.execute("update revisions set waivers = '[]', released_at = now() where id = ?", [id]),
    ).rejects.toThrow(/has been released/);
  });

  test('a revision of another kernel is not released', async () => {
    const { id } = await inReview(await make());
    const em = await entityManager();
    await em.execute('alter table revisions disable trigger revisions_frozen');
    await em.execute("update revisions set kernel = '0.0.0' where id = ?", [id]);
    await em.execute('alter table revisions enable trigger revisions_frozen');
    const answer = await move(id, { to: 'released', from: 'in-review' }, 'owner');
    expect(answer.status).toBe(422);
    expect((await refusal(answer)).message).toContain('Name a new revision');
  });
});

describe('a machinist', () => {
  test('sees nothing of what is not released', async () => {
    const designId = await make();
    const { id } = await inReview(designId);
    cast.ask('machinist');
    expect(await (await call(LIST, {})).text()).not.toContain(designId);
    for (const answer of [
      await call(DESIGN, { id: designId }),
      await call(DRAFT_FILES, { id: designId }),
      await call(DIAL, { id: designId }, { query: dial }),
      await call(REVISION, { id }),
      await call(FILES, { id }),
    ]) {
      expect(answer.status).toBe(404);
    }
    expect((await move(id, { to: 'released', from: 'in-review' }, 'machinist')).status).toBe(
      403,
    );
  });

  test('downloads just the bytes that were released, and that is recorded', async () => {
    const designId = await make();
    const revision = await released(designId);
    cast.ask('machinist');
    const list = designListSchema.parse(await (await call(LIST, {})).json()).designs;
    expect(list.find(({ id }) => id === designId)).toMatchObject({
      state: { kind: 'released', revision: 1 },
    });
    const [file] = await filesOf(revision.id);
    const answer = await call(FILE, { id: revision.id, name: file!.name });
    expect(answer.headers.get('etag')).toBe(`"${file!.sha256}"`);
    expect((await cast.record(designId)).at(-1)).toMatchObject({
      what: 'file-downloaded',
      revision: revision.id,
      detail: { file: file!.name, sha256: file!.sha256, state: 'released' },
    });
    // The released revision's own dial, too.
    expect((await call(DIAL, { id: designId }, { query: dial })).status).toBe(200);
  });

  test('is told which one to cut instead of a superseded one', async () => {
    const designId = await make();
    const first = await released(designId);
    await released(designId);
    cast.ask('machinist');
    const answer = await call(FILES, { id: first.id });
    expect(answer.status).toBe(410);
    expect((await refusal(answer)).message).toContain('cut revision 2');
    cast.ask('builder');
    expect((await call(FILES, { id: first.id })).status).toBe(200);
  });
});

describe('where a design stands', () => {
  const known = (number: number, state: RevisionState, version = 1) => ({
    number,
    state,
    version,
  });
  test.each([
    ['nothing named', [], 'draft', null],
    ['a draft', [known(1, 'draft')], 'draft', null],
    [
      'in review under a newer draft',
      [known(1, 'in-review'), known(2, 'draft')],
      'in-review',
      1,
    ],
    ['released', [known(1, 'released', 2)], 'released', 1],
    ['saved since', [known(1, 'released')], 'changed', 1],
    ['released again', [known(1, 'superseded'), known(2, 'released', 2)], 'released', 2],
    ['an older one last', [known(1, 'withdrawn'), known(2, 'superseded')], 'withdrawn', 1],
  ] as const)('%s', (_words, revisions, kind, revision) => {
    expect(designState(2, revisions)).toEqual({ kind, revision });
  });
});

describe('a withdrawn revision', () => {
  test('gives its files to nobody, and says why', async () => {
    const designId = await make();
    const { id } = await released(designId);
    cast.ask('machinist');
    const [file] = await filesOf(id);
    const out = { to: 'withdrawn', from: 'released', reason: 'Hole 0.2 mm too small' } as const;
    expect((await move(id, out)).status).toBe(200);
    for (const who of ['owner', 'builder', 'machinist'] as const) {
      cast.ask(who);
      const answer = await call(FILE, { id, name: file!.name });
      expect(answer.status).toBe(410);
      const { code, message } = await refusal(answer);
      expect(code).toBe('withdrawn');
      expect(message).toContain('Test builder: Hole 0.2 mm too small');
    }
    cast.ask('machinist');
    const list = designListSchema.parse(await (await call(LIST, {})).json()).designs;
    expect(list.find((design) => design.id === designId)!.state).toEqual({
      kind: 'withdrawn',
      revision: 1,
    });
    const em = await entityManager();
    expect(await em.count(Mail, { event: `revision-withdrawn:${id}` })).toBe(2);
  });

  test('also stops a download that had begun before it', async () => {
    const { id } = await released(await make());
    const [file] = await filesOf(id);
    const em = await entityManager();
    cast.ask('machinist');
    const begun = await em.transactional(async (tx) => {
      await tx.execute(
        "update revisions set state = 'withdrawn', withdrawn_reason = 'Cracked' where id = ?",
        [id],
      );
      // What is not committed yet is not seen, so it goes on until it has to wait.
      const answer = call(FILE, { id, name: file!.name });
      await expect(
        Promise.race([answer, new Promise((done) => setTimeout(done, 400, 'waits'))]),
      ).resolves.toBe('waits');
      return { answer };
    });
    const answer = await begun.answer;
    expect(answer.status).toBe(410);
    expect((await refusal(answer)).message).toContain('Cracked');
  });

  test('is what a machinist is told of, also when it has a lower number than one before', async () => {
    const designId = await make();
    const first = await inReview(designId);
    const second = await released(designId);
    expect((await move(first.id, { to: 'released', from: 'in-review' })).status).toBe(200);
    const out = { to: 'withdrawn', from: 'released', reason: 'Cracked' } as const;
    expect((await move(first.id, out)).status).toBe(200);
    for (const who of ['machinist', 'builder'] as const) {
      cast.ask(who);
      const list = designListSchema.parse(await (await call(LIST, {})).json()).designs;
      expect(list.find((design) => design.id === designId)!.state).toEqual({
        kind: 'withdrawn',
        revision: 1,
      });
    }
    cast.ask('machinist');
    const answer = await call(DIAL, { id: designId }, { query: dial });
    expect((await refusal(answer)).message).toContain('Cracked');
    expect((await call(FILES, { id: second.id })).status).toBe(410);
  });

  test('needs a reason', async () => {
    const { id } = await released(await make());
    const answer = await move(id, { to: 'withdrawn', from: 'released', reason: ' ' });
    expect(answer.status).toBe(422);
    expect((await refusal(answer)).message).toMatch(/^Reason: /);
  });
});
