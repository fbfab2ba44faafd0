import 'server-only';
import { mayEdit, requireMember } from '../access';
import { badInput, notFound, RequestError } from '../errors';
import { moveRevisionSchema, type Revision } from '../schemas/revision';
import { askForReview } from './ask-for-review';
import { findRevision } from './queries';
import { releaseRevision } from './release-revision';
import { sendBack } from './send-back';
import { withdrawRevision } from './withdraw-revision';

/** From where each way begins; the database holds to the same (migrations/004). */
const begins: Record<Revision['state'], readonly Revision['state'][]> = {
  draft: ['in-review'],
  'in-review': ['draft'],
  released: ['in-review'],
  superseded: [],
  withdrawn: ['released', 'superseded'],
};

/** Moves a revision on, or back into draft. @throws RequestError as each way does */
export async function moveRevision(id: string, input: unknown): Promise<Revision> {
  const viewer = await requireMember(mayEdit);
  const revision = await findRevision(viewer, id);
  if (!revision) throw notFound('revision');
  const parsed = moveRevisionSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const asked = parsed.data;
  if (!begins[asked.to].includes(asked.from)) {
    throw new RequestError(
      'bad-input',
      `From: a revision goes to ${asked.to} from ${begins[asked.to].join(' or ')}, not from ${asked.from}.`,
      { field: 'from' },
    );
  }
  switch (asked.to) {
    case 'in-review':
      return askForReview(viewer, revision, asked.from);
    case 'draft':
      return sendBack(viewer, revision, asked.from, asked.reason);
    case 'released':
      return releaseRevision(viewer, revision, asked.from, asked.waivers);
    case 'withdrawn':
      return withdrawRevision(viewer, revision, asked.from, asked.reason);
  }
}
