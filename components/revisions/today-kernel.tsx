'use client';

import { useMutation } from '@tanstack/react-query';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { KERNEL_VERSION, type Derivation, type Derived } from '@/geometry';
import { deriveToday } from './derive-today';
import { figurePairs } from './figures-of';

function Changes({ then, now }: { then: Derived; now: Derivation }) {
  if (!now.ok) {
    return (
      <>
        <p>Today’s kernel makes no plates of it:</p>
        <ul className="list-disc pl-5">
          {now.findings.map(({ label, change }) => (
            <li key={label}>{change ? `${label}: ${change}` : label}</li>
          ))}
        </ul>
      </>
    );
  }
  const changed = figurePairs(then, now.derived).filter(({ same }) => !same);
  if (changed.length === 0) return <p>No figure would change.</p>;
  return (
    <>
      <p>
        As kept by kernel {then.kernel}, then by kernel {now.derived.kernel}:
      </p>
      <dl className="flex flex-col">
        {changed.map(({ label, a, b, change }) => (
          <div key={label} className="border-b border-line py-1.5 last:border-0">
            <dt>{label}</dt>
            <dd className="text-ink-2">
              {a ?? 'none'}, then {b ?? 'none'}
            </dd>
            {change && <dd>{change}</dd>}
          </div>
        ))}
      </dl>
    </>
  );
}

/** For a revision of an earlier kernel: what today's would make of the same parameters. */
export default function TodayKernel({ derived }: { derived: Derived }) {
  const today = useMutation({ mutationFn: () => deriveToday(derived.design) });
  return (
    <PanelSection title="Made by an earlier kernel">
      <p>
        Kernel {derived.kernel} derived these plates, and they stay so. Today’s is{' '}
        {KERNEL_VERSION}; it may make others of the same parameters.
      </p>
      {today.data ? (
        <Changes then={derived} now={today.data} />
      ) : (
        <Button isDisabled={today.isPending} onPress={() => today.mutate()}>
          {today.isPending ? 'Deriving' : 'Show what today’s kernel would change'}
        </Button>
      )}
      {today.isError && <Notice look="bad">{today.error.message}</Notice>}
    </PanelSection>
  );
}
