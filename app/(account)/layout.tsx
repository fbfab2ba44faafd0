import type { ReactNode } from 'react';
import { Mark } from '@/components/ui/mark';

export default function AccountLayout({ children }: { children: ReactNode }) {
  return (
    <main className="mx-auto flex min-h-dvh w-full max-w-100 flex-col gap-6 px-5 pt-[10vh] pb-10">
      <div className="flex flex-col gap-1">
        <p className="wide-letter flex items-center gap-2.5 text-title font-bold">
          <Mark size={30} />
          Vaneloft
        </p>
        <p className="text-ink-2">
          Plates of air-spaced variable capacitors, from the tuning law to the cut file.
        </p>
      </div>
      {children}
    </main>
  );
}
