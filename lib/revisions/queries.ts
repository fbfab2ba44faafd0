import 'server-only';
import type { EntityManager, FilterQuery } from '@mikro-orm/postgresql';
import { Design, DesignVersion, Revision, RevisionFile } from '@/entities';
import { checkDesign, type Derivation, type Design as Parameters } from '@/geometry';
import { mayEdit, mayRead, type Viewer } from '../access';
import { inWorkshop } from '../db';
import { filePartsOf } from '../kernel/file-parts';
import { deriveDesign } from '../kernel/kernel';
import { materialWords } from '../kernel/make-files';
import { findDesign } from '../queries';
import type { DesignFiles } from '../schemas/api';
import { idSchema } from '../schemas/id';
import type { History, Revision as RevisionRecord } from '../schemas/revision';
import { revisionPeople, toRevision } from './revision-record';

/** States in which a revision has been released, now or once. */
const RELEASED_ONCE = ['released', 'superseded', 'withdrawn'] as const;

/** Revisions of designs that are there and that the viewer may know of. */
const known = ({ workshopId, role }: Viewer): FilterQuery<Revision> => ({
  workshop: workshopId,
  design: { deletedAt: null },
  ...(!mayEdit(role) && { state: { $in: [...RELEASED_ONCE] } }),
});

function readRevisions(
  tx: EntityManager,
  where: FilterQuery<Revision>,
): Promise<RevisionRecord[]> {
  return tx
    .find(Revision, where, {
      populate: [...revisionPeople],
      exclude: ['derivation', 'parameters'],
      orderBy: { number: 'desc' },
    })
    .then((found) => found.map((stored) => toRevision(stored)));
}

async function findOne(
  viewer: Viewer,
  where: FilterQuery<Revision>,
): Promise<RevisionRecord | null> {
  if (!mayRead(viewer.role)) return null;
  const found = await inWorkshop(viewer, (tx) =>
    readRevisions(tx, { $and: [known(viewer), where] }),
  );
  return found[0] ?? null;
}

/** A revision of the workshop that the viewer may know of, or null. */
export const findRevision = async (
  viewer: Viewer,
  id: string,
): Promise<RevisionRecord | null> =>
  idSchema.safeParse(id).success ? findOne(viewer, { id }) : null;

export const findRevisionByNumber = async (
  viewer: Viewer,
  designId: string,
  number: number,
): Promise<RevisionRecord | null> =>
  idSchema.safeParse(designId).success && Number.isSafeInteger(number) && number < 2 ** 31
    ? findOne(viewer, { design: designId, number })
    : null;

/** The one released last, which need not have the highest number. */
const lastReleased = (revisions: readonly RevisionRecord[]): RevisionRecord | null =>
  revisions.reduce<RevisionRecord | null>(
    (last, one) => (last && (last.releasedAt ?? '') >= (one.releasedAt ?? '') ? last : one),
    null,
  );

/** What a design is cut from: its released revision, else the last that was; null if none was. */
export async function findReleased(
  viewer: Viewer,
  designId: string,
): Promise<RevisionRecord | null> {
  if (!mayRead(viewer.role) || !idSchema.safeParse(designId).success) return null;
  const state = { $in: [...RELEASED_ONCE] };
  const found = await inWorkshop(viewer, (tx) =>
    readRevisions(tx, { $and: [known(viewer), { design: designId, state }] }),
  );
  return found.find((one) => one.state === 'released') ?? lastReleased(found);
}

/** Revisions and saves of a design, newest first; null where there is no such design. */
export async function historyOf(viewer: Viewer, designId: string): Promise<History | null> {
  if (!mayEdit(viewer.role) || !idSchema.safeParse(designId).success) return null;
  return inWorkshop(viewer, async (tx) => {
    const where = { id: designId, workshop: viewer.workshopId, deletedAt: null };
    if (!(await tx.findOne(Design, where, { fields: ['id'] }))) return null;
    const versions = await tx.find(
      DesignVersion,
      { design: designId },
      { populate: ['savedBy'], exclude: ['parameters'], orderBy: { version: 'desc' } },
    );
    return {
      revisions: await readRevisions(tx, { design: designId }),
      versions: versions.map(({ version, name, kernel, checks, createdAt, savedBy }) => ({
        version,
        name,
        kernel,
        checks,
        savedAt: createdAt.toISOString(),
        savedBy: { id: savedBy.id, name: savedBy.name },
      })),
    };
  });
}

/** What was frozen in a revision: parameters, and what the kernel of then said of them. */
export async function derivationOf(
  viewer: Viewer,
  id: string,
): Promise<{ design: Parameters; derivation: Derivation } | null> {
  if (!(await findRevision(viewer, id))) return null;
  return inWorkshop(viewer, async (tx) => {
    const { parameters, derivation } = await tx.findOneOrFail(Revision, { id });
    return { design: parameters, derivation };
  });
}

/** The list of a revision's files, as they are kept; null where there is no such revision. */
export async function revisionFiles(viewer: Viewer, id: string): Promise<DesignFiles | null> {
  const revision = await findRevision(viewer, id);
  if (!revision) return null;
  return inWorkshop(viewer, async (tx) => {
    const files = await tx.find(
      RevisionFile,
      { revision: id },
      { orderBy: { position: 'asc' } },
    );
    const { derivation } = await tx.findOneOrFail(Revision, { id });
    return {
      version: revision.version,
      files: files.map(({ name, label, kind, bytes, sha256 }) => ({
        name,
        label,
        kind: kind as DesignFiles['files'][number]['kind'],
        bytes,
        sha256,
      })),
      parts: derivation.ok
        ? filePartsOf(revision.designName, derivation.derived, materialWords)
        : [],
    };
  });
}

/** One state of a design, to be compared or gone on from. */
export interface DesignState {
  readonly name: string;
  readonly design: Parameters;
  readonly derivation: Derivation;
}

/**
 * `draft` is what is saved, `v3` a save, `r2` a revision. A save is derived by today's kernel, a
 * revision as it was. Null where there is no such state.
 */
export async function stateOf(
  viewer: Viewer,
  designId: string,
  which: string,
): Promise<DesignState | null> {
  const [, kind, digits] = /^(v|r)(\d{1,9})$/.exec(which) ?? [];
  const number = Number(digits);
  if (kind === 'r') {
    const revision = await findRevisionByNumber(viewer, designId, number);
    const frozen = revision && (await derivationOf(viewer, revision.id));
    return frozen && { name: `${revision.designName}, revision ${number}`, ...frozen };
  }
  const saved = await findDesign(viewer, designId);
  if (!saved) return null;
  let { name, design } = saved;
  if (kind === 'v') {
    const kept = await inWorkshop(viewer, (tx) =>
      tx.findOne(DesignVersion, { design: designId, version: number }),
    );
    if (!kept) return null;
    name = `${kept.name}, version ${number}`;
    design = checkDesign(kept.parameters);
  } else if (which !== 'draft') return null;
  return { name, design, derivation: await deriveDesign(design) };
}
