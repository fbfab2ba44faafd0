import 'server-only';
import { isDeepStrictEqual } from 'node:util';
import { Revision, RevisionFile, User, type Waiver } from '@/entities';
import { KERNEL_VERSION, type Derivation, type Finding } from '@/geometry';
import { mayRelease, mayWaive, type Viewer } from '../access';
import { inWorkshop } from '../db';
import { RequestError } from '../errors';
import { describeFailure, findingsOf } from '../kernel/assessment';
import { deriveDesign, derivePlates, makeFiles } from '../kernel/kernel';
import { tellMembers } from '../mail/tell-members';
import { addRecord } from '../record';
import type { Revision as RevisionRecord, RevisionState } from '../schemas/revision';
import { addFiles, revisionNames, waiverWords } from './freeze';
import { lockRevision, refuseMoved } from './lock-revision';
import { derivationOf } from './queries';
import { toRevision } from './revision-record';

interface Word {
  readonly code: string;
  readonly section: number | null;
  readonly label: string;
  readonly reason: string;
}

/** As the database gives it back: plain JSON. */
const plain = (derivation: Derivation): unknown => JSON.parse(JSON.stringify(derivation));

/** Each failing check with the owner's word for it. @throws RequestError checks-fail, not-allowed */
function waiversFor(
  viewer: Viewer,
  findings: readonly Finding[],
  words: readonly Word[],
): Waiver[] {
  const failing = findings.filter(({ severity }) => severity === 'fail');
  return failing.map((finding) => {
    const { code, section, label } = finding;
    const word = words.find(
      (one) => one.code === code && one.section === section && one.label === label,
    );
    if (!word) {
      throw new RequestError(
        'checks-fail',
        `Not released: ${failing.length} of its checks ${failing.length === 1 ? 'fails' : 'fail'}. ${describeFailure(finding)} The owner may release it all the same, with a reason for each.`,
        { field: 'waivers' },
      );
    }
    if (!mayWaive(viewer.role)) {
      throw new RequestError(
        'not-allowed',
        `A ${viewer.role} may not release in spite of a check that fails; ask an owner of ${viewer.workshopName}.`,
      );
    }
    return { code, section, label, reason: word.reason, by: viewer.name };
  });
}

/**
 * Makes a revision the one to cut: derived again by the kernel that froze it, every file written
 * with the release in its drawing, the one before it superseded.
 * @throws RequestError conflict when it moved meanwhile; checks-fail when a check fails without the
 *   owner's word, or today's kernel is another than the one that froze it
 */
export async function releaseRevision(
  viewer: Viewer,
  revision: RevisionRecord,
  from: RevisionState,
  words: readonly Word[],
): Promise<RevisionRecord> {
  if (!mayRelease(viewer.role)) {
    throw new RequestError('not-allowed', `A ${viewer.role} may not release a revision.`);
  }
  refuseMoved(revision, from);
  const { id, designId, designName, number, name } = revision;
  const frozen = (await derivationOf(viewer, id))!;
  const derivation = await deriveDesign(frozen.design);
  if (
    revision.kernel !== KERNEL_VERSION ||
    !isDeepStrictEqual(plain(derivation), frozen.derivation)
  ) {
    throw new RequestError(
      'checks-fail',
      `Not released: revision ${number} was derived by kernel ${revision.kernel}, and today's (${KERNEL_VERSION}) says otherwise. Name a new revision of the design and release that.`,
      { field: 'kernel' },
    );
  }
  const waivers = waiversFor(viewer, findingsOf(derivation), words);
  const at = new Date();
  const files = await makeFiles(
    frozen.design,
    await derivePlates(frozen.design),
    revisionNames(
      { id: designId, name: designName },
      viewer.workshopName,
      { number, creator: revision.createdBy.name, issued: at },
      {
        by: viewer.name,
        waivers: waivers.map(waiverWords),
      },
    ),
  );

  return inWorkshop(viewer, async (tx) => {
    const stored = await lockRevision(tx, viewer, revision, from);
    const before = await tx.findOne(
      Revision,
      { design: designId, state: 'released' },
      { exclude: ['derivation', 'parameters'] },
    );
    if (before) {
      tx.assign(before, { state: 'superseded', updatedAt: at });
      addRecord(tx, viewer, {
        what: 'revision-superseded',
        subject: designId,
        revision: before.id,
        detail: { number: before.number, by: number },
      });
    }
    await tx.nativeDelete(RevisionFile, { revision: id });
    addFiles(tx, stored, files, at);
    // Before the release: a released revision takes no files, and a design has but one.
    await tx.flush();
    tx.assign(stored, {
      state: 'released',
      waivers,
      releasedBy: await tx.findOneOrFail(User, viewer.userId),
      releasedAt: at,
      updatedAt: at,
    });
    addRecord(tx, viewer, {
      what: 'revision-released',
      subject: designId,
      revision: id,
      detail: {
        number,
        kernel: revision.kernel,
        waivers: waivers.map(({ label, reason }) => `${label}. ${reason}`),
        files: files.map((file) => `${file.name} ${file.sha256}`),
      },
    });
    await tellMembers(tx, viewer, {
      choice: 'released',
      event: `revision-released:${id}`,
      to: () => true,
      subject: `Released: revision ${number} of ${designName}`,
      lines: [
        `${viewer.name} has released revision ${number} of ${designName} (${name}).`,
        ...(before ? [`It takes the place of revision ${before.number}.`] : []),
        'Its files are the ones to cut from.',
      ],
      link: { path: `/designs/${designId}`, label: 'See what is to be cut' },
    });
    await tx.flush();
    return toRevision(stored);
  });
}
