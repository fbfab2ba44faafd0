import { Figures } from '@/components/design/figures';
import { PanelSection } from '@/components/design/panel-section';
import { LocalTime } from '@/components/ui/local-time';
import type { Revision } from '@/lib/schemas/revision';
import { WaiverList } from './waiver-list';

/** Where a revision comes from, and what was released in spite of what. */
export function KeptAs({ revision }: { revision: Revision }) {
  const { version, kernel, createdBy, createdAt, releasedBy, releasedAt } = revision;
  return (
    <PanelSection title="This revision">
      <Figures
        rows={[
          ['Version of the design', version],
          ['Kernel', kernel],
          ['Named by', createdBy.name],
          ['Named', <LocalTime key="named" iso={createdAt} />],
          ...(releasedBy ? ([['Released by', releasedBy.name]] as const) : []),
          ...(releasedAt
            ? ([['Released', <LocalTime key="released" iso={releasedAt} />]] as const)
            : []),
        ]}
      />
      {revision.note && (
        <p className="border-l-4 border-line px-3 wrap-anywhere whitespace-pre-wrap">
          {revision.note}
        </p>
      )}
      <WaiverList waivers={revision.waivers} />
    </PanelSection>
  );
}
