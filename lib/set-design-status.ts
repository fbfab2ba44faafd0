import 'server-only';
import { User } from '@/entities';
import { mayEdit, requireMember } from './access';
import { inWorkshop } from './db';
import { toRecord } from './design-record';
import { badInput, notFound, RequestError } from './errors';
import { lockDesign, refuseStale } from './lock-design';
import { assessmentOf, describeFailure, findingsOf } from './kernel/assessment';
import { deriveDesign } from './kernel/kernel';
import { findDesign } from './queries';
import { addRecord } from './record';
import { setStatusSchema, type DesignRecord } from './schemas/api';

/**
 * Says that a design may be cut, or takes that back. It is checked by today's kernel first.
 * @throws RequestError checks-fail when any check fails; conflict as saving does.
 */
export async function setDesignStatus(id: string, input: unknown): Promise<DesignRecord> {
  const viewer = await requireMember(mayEdit);
  const before = await findDesign(viewer, id);
  if (!before) throw notFound();
  const parsed = setStatusSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { version, status } = parsed.data;
  refuseStale(before, version);
  const derivation = await deriveDesign(before.design);
  return inWorkshop(viewer, async (tx) => {
    const stored = await lockDesign(tx, viewer, id);
    refuseStale(toRecord(stored, viewer), version);
    if (stored.status === status) return toRecord(stored, viewer);

    const { kernel, checks } = assessmentOf(derivation);
    const failing = findingsOf(derivation).find(({ severity }) => severity === 'fail');
    if (status === 'ready' && failing) {
      throw new RequestError(
        'checks-fail',
        `Not ready: ${checks.fail} of its checks ${checks.fail === 1 ? 'fails' : 'fail'}. ${describeFailure(failing)}`,
        { field: 'status' },
      );
    }
    tx.assign(stored, {
      status,
      kernel,
      checks,
      version: stored.version + 1,
      updatedBy: await tx.findOneOrFail(User, viewer.userId),
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'design-status-set',
      subject: id,
      detail: { version: stored.version, status, kernel, checks },
    });
    await tx.flush();
    return toRecord(stored, viewer);
  });
}
