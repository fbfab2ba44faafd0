import 'server-only';
import { machineOf, type MachineValues } from '@/geometry/cutting/shop-parameters';
import type { Machine } from '@/geometry/cutting/machine';
import { mayDownload, requireMember, type Viewer } from './access';
import { findCutSource } from './cut-source';
import { inWorkshop } from './db';
import { badInput, notFound, RequestError } from './errors';
import type { HashedFile } from './kernel/hashed-file';
import { addRecord } from './record';
import { holdInUse } from './revisions/out-of-use';
import { writeSheetsSchema } from './schemas/sheets';
import { sheetAlone, sheetBundle, sheetFiles } from './sheet-files';
import { listShopItems } from './shop-items';

type Asked = ReturnType<typeof writeSheetsSchema.parse>;

async function machineFor(viewer: Viewer, asked: Asked['machine']): Promise<Machine> {
  if (asked.from === 'values') {
    return machineOf(asked.name, asked.values as unknown as MachineValues);
  }
  const machines = await listShopItems(viewer, 'machines');
  const stored = machines.find(({ id }) => id === asked.id);
  if (!stored) throw notFound('machine');
  if (stored.version !== asked.version) {
    throw new RequestError(
      'conflict',
      `${stored.name}: ${stored.updatedBy.name} has changed it since; lay the sheets out anew.`,
      { field: 'machine.version', current: stored },
    );
  }
  return machineOf(stored.name, stored.values as unknown as MachineValues);
}

/**
 * The files of a layout on sheets, made from the saved version: all in a ZIP, or one sheet's DXF.
 * Nothing is taken from the browser but where the parts lie, and that is measured. With a row in
 * the record that names the bytes by their hash.
 * @throws RequestError not-found, conflict when the design or machine was saved since, checks-fail,
 *   bad-input when the layout does not hold.
 */
export async function writeSheets(id: string, input: unknown): Promise<HashedFile> {
  const viewer = await requireMember(mayDownload);
  const source = await findCutSource(viewer, id);
  if (!source) throw notFound();
  const parsed = writeSheetsSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { version, machine: named, only, ...rest } = parsed.data;
  if (source.version !== version) {
    throw new RequestError(
      'conflict',
      `Version: this layout is of ${version}, but ${source.by} has made it version ${source.version} since; lay it out anew.`,
      { field: 'version', current: source.current },
    );
  }
  const given = { ...rest, machine: await machineFor(viewer, named) };
  const { derived, status, waivers } = source;
  const names = { design: source.name, revision: source.revision, status, waivers };
  const made = only
    ? sheetAlone(derived, names, given, only)
    : sheetBundle(names, given.kerf, sheetFiles(derived, names, given));
  if (!made) {
    throw new RequestError('bad-input', 'Sheet: there is no such sheet in the layout.', {
      field: 'only',
    });
  }
  await inWorkshop(viewer, async (tx) => {
    if (source.revisionId) await holdInUse(tx, viewer, source.revisionId);
    addRecord(tx, viewer, {
      what: 'file-downloaded',
      subject: id,
      ...(source.revisionId && { revision: source.revisionId }),
      detail: {
        file: made.name,
        sha256: made.sha256,
        bytes: made.body.byteLength,
        version,
        kernel: derived.kernel,
        kerf: given.kerf,
        machine: { name: given.machine.name, kerf: given.machine.kerf },
        capacitors: given.copies,
      },
    });
  });
  return made;
}
