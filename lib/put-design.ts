import 'server-only';
import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { PARAMETERS_FORMAT, User, type Design as StoredDesign } from '@/entities';
import type { Design } from '@/geometry';
import type { Viewer } from './access';
import { changesBetween } from './changes';
import { readParameters } from './design-record';
import type { Assessment } from './kernel/assessment';
import { addRecord } from './record';
import { keepVersion } from './revisions/keep-version';

/**
 * Writes a design over the one that is held, as its next version, with a row in the record. What
 * is stored already changes nothing.
 */
export async function putDesign(
  tx: EntityManager,
  viewer: Viewer,
  stored: Loaded<StoredDesign, 'updatedBy'>,
  next: Assessment & { readonly name: string; readonly design: Design },
  record: {
    readonly what: 'design-saved' | 'design-restored';
    readonly detail?: Record<string, unknown>;
  },
): Promise<{ changed: boolean }> {
  const { name, design, kernel, checks } = next;
  const changes = changesBetween(
    { name: stored.name, design: readParameters(stored) },
    { name, design },
  );
  if (changes.length === 0 && stored.kernel === kernel) return { changed: false };
  tx.assign(stored, {
    name,
    parameters: design,
    parametersFormat: PARAMETERS_FORMAT,
    kernel,
    checks,
    version: stored.version + 1,
    updatedBy: await tx.findOneOrFail(User, viewer.userId),
    updatedAt: new Date(),
  });
  keepVersion(tx, stored);
  addRecord(tx, viewer, {
    what: record.what,
    subject: stored.id,
    detail: { version: stored.version, ...record.detail, kernel, checks, changes },
  });
  return { changed: true };
}
