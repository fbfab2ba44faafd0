import 'server-only';
import { mayDownload, requireMember } from './access';
import { inWorkshop } from './db';
import { hashedFiles } from './design-files';
import { notFound, RequestError } from './errors';
import type { HashedFile } from './kernel/hashed-file';
import { derivePlates } from './kernel/kernel';
import { findDesign } from './queries';
import { addRecord } from './record';

/**
 * One file of a design, from the stored parameters, with a row in the record that names its
 * bytes by their hash. No row, no file.
 * @throws RequestError not-found or checks-fail.
 */
export async function recordDownload(id: string, fileName: string): Promise<HashedFile> {
  const viewer = await requireMember(mayDownload);
  const stored = await findDesign(viewer, id);
  if (!stored) throw notFound();
  const derived = await derivePlates(stored.design);
  const files = await hashedFiles(stored, viewer.workshopName, derived);
  const file = files.find(({ name }) => name === fileName);
  if (!file) {
    throw new RequestError(
      'not-found',
      'No such file in this design; it may have been saved since. Load the list of files again.',
    );
  }
  await inWorkshop(viewer, (tx) => {
    addRecord(tx, viewer, {
      what: 'file-downloaded',
      subject: id,
      detail: {
        file: file.name,
        sha256: file.sha256,
        bytes: file.body.byteLength,
        version: stored.version,
        kernel: derived.kernel,
      },
    });
  });
  return file;
}
