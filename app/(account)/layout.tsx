import type { ReactNode } from 'react';
import { ScribedPlates } from '@/components/account/scribed-plates';
import { Mark } from '@/components/ui/mark';
import { defaultDesign, derive } from '@/geometry';

/** Real plates, those of the default design, at a shaft angle that shows both. */
const derivation = derive(defaultDesign());

export default function AccountLayout({ children }: { children: ReactNode }) {
  const section = derivation.ok ? derivation.derived.sections[0] : undefined;
  return (
    <div className="grid min-h-dvh bench:grid-cols-2">
      <main id="main" className="flex flex-col gap-6 px-5 pt-[10vh] pb-10">
        <div className="mx-auto flex w-full max-w-100 flex-col gap-6">
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
        </div>
      </main>
      <div className="flex items-center bg-floor max-bench:hidden">
        {derivation.ok && section && (
          <ScribedPlates
            section={section}
            reach={derivation.derived.stack.outerRadius * 1.15}
            turn={115}
          />
        )}
      </div>
    </div>
  );
}
