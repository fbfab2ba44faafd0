import 'server-only';
import { dialOf } from '@/geometry/dial/dial';
import { DialError } from '@/geometry/dial/settings';
import { slugOf } from '@/geometry/files';
import { mayDownload, requireMember } from './access';
import { findCutSource } from './cut-source';
import { inWorkshop } from './db';
import { badInput, notFound, RequestError } from './errors';
import { sketchesPdf } from './kernel/drawing-pdf';
import { hashOf, type HashedFile } from './kernel/hashed-file';
import { addRecord } from './record';
import { holdInUse } from './revisions/out-of-use';
import { dialQuerySchema } from './schemas/dial';

/** A dial of the saved version, or of the released revision for who may not edit, as PDF, true size, with a row in the record. @throws RequestError */
export async function makeDial(id: string, query: unknown): Promise<HashedFile> {
  const viewer = await requireMember(mayDownload);
  const source = await findCutSource(viewer, id);
  if (!source) throw notFound();
  const parsed = dialQuerySchema.safeParse(query);
  if (!parsed.success) throw badInput(parsed.error);
  const { section, ...settings } = parsed.data;
  const { derived } = source;
  const result = derived.sections[section];
  if (!result) {
    throw new RequestError('bad-input', `Section: there is no section ${section + 1} in it.`, {
      field: 'section',
    });
  }
  try {
    const body = await sketchesPdf([dialOf(result, derived.turn, settings)], {
      title: `Dial of ${source.name}`,
      author: viewer.workshopName,
      issued: source.issued,
    });
    const sha256 = hashOf(body);
    const name = `${slugOf(source.name)}_dial-${settings.quantity}.pdf`;
    await inWorkshop(viewer, async (tx) => {
      if (source.revisionId) await holdInUse(tx, viewer, source.revisionId);
      addRecord(tx, viewer, {
        what: 'file-downloaded',
        subject: id,
        ...(source.revisionId && { revision: source.revisionId }),
        detail: {
          file: name,
          sha256,
          bytes: body.byteLength,
          version: source.version,
          settings,
        },
      });
    });
    const label = 'Dial, true size';
    return { name, label, kind: 'pdf', mediaType: 'application/pdf', body, sha256 };
  } catch (error) {
    if (error instanceof DialError) throw new RequestError('bad-input', error.message);
    throw error;
  }
}
