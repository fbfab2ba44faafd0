'use client';

import { useRouter } from 'next/navigation';
import { openWorkshop } from '@/components/api/account';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { TaskNotice } from './task-notice';
import { useTask } from './use-task';

export function OpenWorkshopForm() {
  const router = useRouter();
  const task = useTask();
  const onSubmit = task.submit(async ({ workshop = '' }) => {
    await openWorkshop(workshop);
    router.replace('/designs');
    router.refresh();
    return null;
  });
  return (
    <details>
      <summary className="min-h-9 cursor-pointer py-1.5 font-medium max-bench:min-h-11">
        Set up another workshop
      </summary>
      <form method="post" onSubmit={onSubmit} className="flex flex-col items-start gap-3 pt-2">
        <div className="w-full max-w-80">
          <TextField
            label="Workshop"
            name="workshop"
            autoComplete="organization"
            description="You will be its owner."
            isRequired
          />
        </div>
        <TaskNotice {...task} />
        <Button type="submit" isDisabled={task.busy}>
          Set it up
        </Button>
      </form>
    </details>
  );
}
