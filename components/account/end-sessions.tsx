'use client';

import { useRouter } from 'next/navigation';
import { endSessions } from '@/components/api/account';
import { Button } from '@/components/ui/button';
import { TaskNotice } from './task-notice';
import { useTask } from './use-task';

export function EndSessions() {
  const router = useRouter();
  const task = useTask();
  return (
    <div className="flex flex-col items-start gap-3">
      <p>Every browser in which you are signed in is signed out, this one too.</p>
      <TaskNotice {...task} />
      <Button
        look="danger"
        isDisabled={task.busy}
        onPress={() =>
          task.run(async () => {
            await endSessions();
            router.replace('/sign-in');
            router.refresh();
            return null;
          })
        }
      >
        Sign out everywhere
      </Button>
    </div>
  );
}
