import type { ReactNode } from 'react';

/** A whole page that holds one message and the way on. */
export function PageMessage({ title, children }: { title: string; children: ReactNode }) {
  return (
    <main
      id="main"
      className="mx-auto flex w-full max-w-140 flex-col items-start gap-4 px-5 py-[12vh]"
    >
      <h1 className="text-head">{title}</h1>
      {children}
    </main>
  );
}
