import type { SectionResult } from '@/geometry';
import { writeDegrees } from './degrees';

/** What the hatching on the rule means, and which field the curves below it hold. */
export function RuleNotes({ section: { law, model } }: { section: SectionResult }) {
  return (
    <>
      <p className="text-small text-ink-2">
        law {writeDegrees(law.from)}° to {writeDegrees(law.to)}°, rests hatched
      </p>
      {/* A line of its own on a narrow screen, so that nothing moves when the words change. */}
      <p role="status" className="text-small text-ink-2 max-bench:basis-full wide:ml-auto">
        {model === 'field' ? 'edges and plan view' : 'edges only, plan view being solved'}
      </p>
    </>
  );
}
