import { Button } from '@/components/ui/button';
import type { Job } from './use-job';

/** How far a job is, with a way to end it, and why it failed if it did. */
export function JobProgress({
  job,
  what,
}: {
  job: Pick<Job<never, unknown>, 'progress' | 'failure' | 'cancel'>;
  what: string;
}) {
  const { progress, failure, cancel } = job;
  return (
    <>
      {progress && (
        <div className="flex items-center gap-3">
          <progress
            aria-label={what}
            value={progress.done}
            max={progress.of}
            className="h-2 grow accent-action"
          />
          <Button onPress={cancel}>Cancel</Button>
        </div>
      )}
      {failure && (
        <p role="alert" className="text-bad">
          {failure}
        </p>
      )}
    </>
  );
}
