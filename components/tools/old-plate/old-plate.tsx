'use client';

import { useRef, useState } from 'react';
import { PanelSection } from '@/components/design/panel-section';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import type { Point } from '@/geometry';
import { pointsOf, type OldStack } from '@/geometry/old-plate/plate-law';
import { JobProgress } from '../job/job-progress';
import { useJob } from '../job/use-job';
import type { ToolProps } from '../tool-props';
import { NumberField } from '../number-field';
import type { PlateAnswer, PlateQuestion } from './old-plate.worker';
import { OutlineView } from './outline-view';
import { PlateResult } from './plate-result';
import { readOutline, type OldOutline } from './read-file';

const DEGREE = Math.PI / 180;

const makeWorker = () =>
  new Worker(new URL('./old-plate.worker.ts', import.meta.url), { type: 'module' });

type Unit = '1' | '25.4';
type Sense = '1' | '-1';

/** An old vane's outline read from a file, the law that it makes, and a design that keeps it. */
export default function OldPlate({ design, section, apply }: ToolProps) {
  const job = useJob<PlateQuestion, PlateAnswer>(makeWorker);
  const picker = useRef<HTMLInputElement>(null);
  const [file, setFile] = useState<File | null>(null);
  const [unit, setUnit] = useState<Unit>('1');
  const [outline, setOutline] = useState<OldOutline | null>(null);
  const [trouble, setTrouble] = useState<string | null>(null);
  const [centre, setCentre] = useState<Point>({ x: 0, y: 0 });
  const [sense, setSense] = useState<Sense>('1');
  const own = design.sections[section]!;
  const [stack, setStack] = useState<OldStack>({
    rotorPlates: own.rotorPlates,
    statorPlates: own.statorPlates,
    airGap: own.airGap,
    rotorThickness: own.rotorThickness,
    statorThickness: own.statorThickness,
    cutoutRadius: design.cutoutRadius,
    statorSector: design.statorSector,
    overhang: design.overhang,
    travel: design.travel,
  });
  const [besides, setBesides] = useState(5);

  async function take(chosen: File | null, mmPerUnit: Unit) {
    setFile(chosen);
    if (!chosen) return;
    setOutline(null);
    setTrouble(null);
    try {
      const read = await readOutline(chosen, Number(mmPerUnit));
      const [hole] = [...read.circles].sort((a, b) => b.radius - a.radius);
      setOutline(read);
      if (hole) setCentre({ x: hole.x, y: hole.y });
    } catch (error) {
      setTrouble(error instanceof Error ? error.message : String(error));
    }
  }

  const set = (key: keyof OldStack) => (value: number) =>
    setStack((before) => ({ ...before, [key]: value }));

  function read() {
    if (!outline) return;
    const direction = sense === '1' ? 1 : -1;
    job.start({ design, section, plate: outline.plate, centre, direction, stack });
  }

  function keep({ law }: PlateAnswer) {
    const lawPoints = pointsOf(law, besides * 1e-12);
    apply(
      (before) => ({
        ...before,
        sections: before.sections.map((values, i) =>
          i === section
            ? { ...values, law: 'points' as const, targetKind: 'terminals' as const, lawPoints }
            : values,
        ),
      }),
      `The old plate’s law taken, ${lawPoints.length} rows`,
    );
  }

  return (
    <>
      <PanelSection title="Outline">
        <p className="text-ink-2">
          A DXF or SVG of one rotor vane, true size, made of lines, arcs and circles. It is read
          here in the browser and goes nowhere.
        </p>
        <input
          ref={picker}
          type="file"
          aria-label="Outline file"
          accept=".dxf,.svg,image/svg+xml"
          className="sr-only"
          tabIndex={-1}
          onChange={(event) => {
            void take(event.target.files?.[0] ?? null, unit);
            event.target.value = '';
          }}
        />
        <p className="flex flex-wrap items-center gap-3">
          <Button onPress={() => picker.current?.click()}>Choose a file</Button>
          {file && <span className="wrap-anywhere text-ink-2">{file.name}</span>}
        </p>
        {trouble && (
          <p role="alert" className="text-bad">
            {trouble}
          </p>
        )}
        {outline && !outline.unitKnown && (
          <SelectField
            label="The file names no unit; it is drawn in"
            value={unit}
            options={[
              { value: '1', label: 'millimetres' },
              { value: '25.4', label: 'inches' },
            ]}
            onChange={(chosen) => {
              setUnit(chosen);
              void take(file, chosen);
            }}
          />
        )}
      </PanelSection>
      {outline && (
        <>
          <PanelSection title="Shaft and sense">
            <p className="text-small text-ink-2">
              The centre of the largest hole was taken. Press on the outline or type to set
              another.
            </p>
            <OutlineView
              outline={outline}
              centre={centre}
              leading={job.answer?.leading ?? null}
              onCentre={setCentre}
            />
            <div className="grid grid-cols-2 gap-3">
              <NumberField
                label="Centre x, mm"
                value={centre.x}
                min={-5000}
                max={5000}
                onChange={(x) => setCentre((before) => ({ ...before, x }))}
              />
              <NumberField
                label="Centre y, mm"
                value={centre.y}
                min={-5000}
                max={5000}
                onChange={(y) => setCentre((before) => ({ ...before, y }))}
              />
            </div>
            <SelectField
              label="As drawn it meshes turning"
              value={sense}
              options={[
                { value: '1', label: 'anticlockwise' },
                { value: '-1', label: 'clockwise' },
              ]}
              onChange={setSense}
            />
          </PanelSection>
          <PanelSection title="The old stack">
            <div className="grid grid-cols-2 gap-3">
              <NumberField
                label="Rotor plates"
                whole
                value={stack.rotorPlates}
                min={1}
                max={60}
                onChange={set('rotorPlates')}
              />
              <NumberField
                label="Stator plates"
                whole
                value={stack.statorPlates}
                min={1}
                max={61}
                onChange={set('statorPlates')}
              />
              <NumberField
                label="Air gap, mm"
                value={stack.airGap}
                min={0.1}
                max={15}
                onChange={set('airGap')}
              />
              <NumberField
                label="Stator cut-out radius, mm"
                value={stack.cutoutRadius}
                min={1.5}
                max={80}
                onChange={set('cutoutRadius')}
              />
              <NumberField
                label="Rotor sheet, mm"
                value={stack.rotorThickness}
                min={0.1}
                max={6}
                onChange={set('rotorThickness')}
              />
              <NumberField
                label="Stator sheet, mm"
                value={stack.statorThickness}
                min={0.1}
                max={6}
                onChange={set('statorThickness')}
              />
              <NumberField
                label="Stator sector, °"
                value={stack.statorSector / DEGREE}
                min={10}
                max={300}
                onChange={(degrees) => set('statorSector')(degrees * DEGREE)}
              />
              <NumberField
                label="Travel, °"
                value={stack.travel / DEGREE}
                min={60}
                max={330}
                onChange={(degrees) => set('travel')(degrees * DEGREE)}
              />
              <NumberField
                label="Stator past the rotor, mm"
                value={stack.overhang}
                min={0}
                max={40}
                onChange={set('overhang')}
              />
            </div>
            <p>
              <Button look="action" isDisabled={job.running} onPress={read}>
                Read its law
              </Button>
            </p>
            <JobProgress job={job} what="Reading the law" />
          </PanelSection>
        </>
      )}
      {job.answer && (
        <PanelSection title="Its law">
          <PlateResult answer={job.answer} />
          <NumberField
            label="Frame and trimmer beside the new plates, pF"
            value={besides}
            min={0}
            max={500}
            onChange={setBesides}
          />
          <p>
            <Button onPress={() => job.answer && keep(job.answer)}>Keep this law</Button>
          </p>
          <p className="text-small text-ink-2">
            The stator is taken with an even radius. New plates of this design’s gap, count and
            sheet are then cut to the same capacitance over the angle.
          </p>
        </PanelSection>
      )}
    </>
  );
}
