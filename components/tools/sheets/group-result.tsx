import { Figures } from '@/components/design/figures';
import { PanelSection } from '@/components/design/panel-section';
import { formatQuantity } from '@/geometry';
import type { LaidGroup } from '@/geometry/nesting/lay-out';

const percent = (share: number): string => `${Number((100 * share).toPrecision(3))} %`;

function duration(seconds: number | null): string {
  if (seconds === null) return 'by the sheet';
  const whole = Math.round(seconds);
  const minutes = Math.floor(whole / 60);
  if (minutes < 60) return `${minutes} min ${whole % 60} s`;
  return `${Math.floor(minutes / 60)} h ${minutes % 60} min`;
}

/** Parts of one kind of sheet: what they take. */
export function GroupResult({ group }: { group: LaidGroup }) {
  const { layout, tally, thickness, material } = group;
  const title = `${formatQuantity(thickness, 'length')} ${material}`;
  return (
    <PanelSection title={title.charAt(0).toUpperCase() + title.slice(1)}>
      <Figures
        rows={[
          ['Sheets', String(tally.sheets)],
          ['Yield of the sheets, whole', percent(tally.yieldOfSheets)],
          ['Yield of what is used', percent(tally.yieldOfUsed)],
          [
            'Last sheet used up to',
            formatQuantity(layout.sheets.at(-1)?.used ?? 0, 'length', 4),
          ],
          [
            'Nearest parts',
            layout.nearest === null
              ? 'one part a sheet'
              : formatQuantity(layout.nearest, 'length', 3),
          ],
          ['Length of cut', `${Number((tally.cutLength / 1000).toPrecision(3))} m`],
          ['Piercings', String(tally.pierces)],
          ['Time to cut and pierce', duration(tally.time)],
        ]}
      />
    </PanelSection>
  );
}
