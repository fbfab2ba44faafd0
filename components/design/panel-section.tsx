import type { ReactNode } from 'react';

/** A titled part of a side column. */
export function PanelSection({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="flex flex-col gap-2">
      <h2 className="wide-letter text-body font-semibold">{title}</h2>
      {children}
    </section>
  );
}
