import 'server-only';
import { RevisionFile } from '@/entities';
import { mayDownload, requireMember, type Viewer } from '../access';
import { inWorkshop } from '../db';
import { notFound, RequestError } from '../errors';
import type { HashedFile } from '../kernel/hashed-file';
import { addRecord } from '../record';
import type { DesignFiles } from '../schemas/api';
import type { Revision as RevisionRecord } from '../schemas/revision';
import { holdInUse, refuseOutOfUse } from './out-of-use';
import { findRevision, revisionFiles } from './queries';

async function requireRevision(id: string): Promise<[Viewer, RevisionRecord]> {
  const viewer = await requireMember(mayDownload);
  const revision = await findRevision(viewer, id);
  if (!revision) throw notFound('revision');
  await inWorkshop(viewer, (tx) => refuseOutOfUse(tx, viewer, revision));
  return [viewer, revision];
}

/** What can be downloaded of a revision. @throws RequestError not-found, withdrawn */
export async function listRevisionFiles(id: string): Promise<DesignFiles> {
  const [viewer] = await requireRevision(id);
  return (await revisionFiles(viewer, id))!;
}

/** The kept bytes of one file, with a row in the record. @throws RequestError not-found, withdrawn */
export async function downloadRevisionFile(id: string, name: string): Promise<HashedFile> {
  const [viewer, revision] = await requireRevision(id);
  return inWorkshop(viewer, async (tx) => {
    const file = await tx.findOne(RevisionFile, { revision: id, name }, { populate: ['body'] });
    if (!file) {
      throw new RequestError('not-found', `No such file in revision ${revision.number}.`);
    }
    const { state } = await holdInUse(tx, viewer, id);
    const { label, kind, mediaType, sha256, bytes } = file;
    addRecord(tx, viewer, {
      what: 'file-downloaded',
      subject: revision.designId,
      revision: id,
      detail: { file: name, sha256, bytes, number: revision.number, state },
    });
    return {
      name,
      label,
      kind: kind as HashedFile['kind'],
      mediaType,
      sha256,
      body: Buffer.from(file.body.$),
    };
  });
}
