import { useState, type FormEvent } from 'react';

interface Task {
  readonly busy: boolean;
  /** Why it was refused. */
  readonly error: string | null;
  /** What it did. */
  readonly done: string | null;
  readonly run: (work: () => Promise<string | null>) => void;
  /** For a form: the fields as they were sent. */
  readonly submit: (
    work: (fields: Record<string, string>, form: HTMLFormElement) => Promise<string | null>,
  ) => (event: FormEvent<HTMLFormElement>) => void;
}

/** One thing asked of the server at a time. What `work` resolves to is told when it is done. */
export function useTask(): Task {
  const [state, setState] = useState<Pick<Task, 'busy' | 'error' | 'done'>>({
    busy: false,
    error: null,
    done: null,
  });
  async function run(work: () => Promise<string | null>): Promise<void> {
    setState({ busy: true, error: null, done: null });
    try {
      setState({ busy: false, error: null, done: await work() });
    } catch (error) {
      setState({ busy: false, error: (error as Error).message, done: null });
    }
  }
  return {
    ...state,
    run: (work) => void run(work),
    submit: (work) => (event) => {
      event.preventDefault();
      const form = event.currentTarget;
      const fields = Object.fromEntries(
        [...new FormData(form)].map(([name, value]) => [name, String(value)]),
      );
      void run(() => work(fields, form));
    },
  };
}
