import { useMutation, useQueryClient } from '@tanstack/react-query';
import { loadRevisions } from '@/components/api/load-revisions';
import { RequestError } from '@/components/api/request-error';
import { revisionKeys } from '@/components/api/revision-keys';
import type { MoveRevision, Revision } from '@/lib/schemas/revision';

/** What is stored, if somebody else's move is why one's own was refused. */
function storedIn(error: Error): Revision | null {
  if (!(error instanceof RequestError) || error.code !== 'conflict') return null;
  return error.current && 'releasedAt' in error.current ? error.current : null;
}

/** Moves a revision on; the screen then shows what the server has, also when it refuses. */
export function useMove({ id, designId }: Revision, onDone: () => void) {
  const client = useQueryClient();
  const show = (revision: Revision) => {
    client.setQueryData(revisionKeys.one(id), revision);
    void client.invalidateQueries({ queryKey: revisionKeys.history(designId) });
  };
  return useMutation({
    mutationFn: async (move: MoveRevision) => (await loadRevisions()).moveRevision(id, move),
    onSuccess: (revision) => {
      show(revision);
      onDone();
    },
    onError: (error) => {
      const stored = storedIn(error);
      if (stored) show(stored);
    },
  });
}
