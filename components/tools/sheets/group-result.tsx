import { Figures } from '@/components/design/figures';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { formatQuantity } from '@/geometry';
import type { LaidGroup } from '@/geometry/nesting/lay-out';
import { SheetPreview } from './sheet-preview';

const percent = (share: number): string => `${Number((100 * share).toPrecision(3))} %`;

function duration(seconds: number | null): string {
  if (seconds === null) return 'by the sheet';
  const whole = Math.round(seconds);
  const minutes = Math.floor(whole / 60);
  if (minutes < 60) return `${minutes} min ${whole % 60} s`;
  return `${Math.floor(minutes / 60)} h ${minutes % 60} min`;
}

/** Parts of one kind of sheet: what they take, and each sheet as it will be cut. */
export function GroupResult({
  group,
  onSave,
}: {
  group: LaidGroup;
  /** Saves one of its sheets as DXF. */
  onSave: (sheet: number) => void;
}) {
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
      {layout.sheets.map((_, sheet) => (
        <div key={sheet} className="flex flex-col gap-1.5">
          <SheetPreview group={group} sheet={sheet} />
          <Button className="self-start" onPress={() => onSave(sheet)}>
            Save sheet {sheet + 1} as DXF
          </Button>
        </div>
      ))}
    </PanelSection>
  );
}
