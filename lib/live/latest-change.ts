import 'server-only';
import type { Viewer } from '../access';
import { inWorkshop } from '../db';

/** The number of the last row that the viewer's workshop has in the record, as of now. */
export async function latestChange(viewer: Viewer): Promise<string> {
  const [row] = await inWorkshop(viewer, (tx) =>
    tx.execute<{ id: string }[]>(
      'select coalesce(max(id), 0)::text as id from record_entries where workshop_id = ?',
      [viewer.workshopId],
    ),
  );
  return row!.id;
}
