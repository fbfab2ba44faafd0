import { Notice } from '@/components/ui/notice';

/** What became of a task. */
export function TaskNotice({ error, done }: { error: string | null; done: string | null }) {
  if (error !== null) return <Notice look="bad">{error}</Notice>;
  return done === null ? null : <Notice>{done}</Notice>;
}
