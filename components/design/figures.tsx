import type { ReactNode } from 'react';
import { formatQuantity, type Derived } from '@/geometry';

/** Pairs of name and value, one a line. */
export function Figures({ rows }: { rows: readonly (readonly [string, ReactNode])[] }) {
  return (
    <dl className="grid grid-cols-[1fr_auto] gap-x-3 gap-y-1">
      {rows.map(([name, value]) => (
        <div key={name} className="col-span-2 grid grid-cols-subgrid">
          <dt className="text-ink-2">{name}</dt>
          <dd className="text-right whitespace-nowrap">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

const millimetres = (value: number) => formatQuantity(value, 'length', 4);
const picofarads = (value: number) => formatQuantity(value, 'capacitance', 4);

function mass(grams: number): string {
  return grams >= 1000 ? `${(grams / 1000).toPrecision(3)} kg` : `${grams.toPrecision(3)} g`;
}

/** What comes out of the cutter and onto the shaft. */
export function StackFigures({ derived, section }: { derived: Derived; section: number }) {
  const { stack, sections } = derived;
  const result = sections[section];
  if (!result) return null;
  return (
    <Figures
      rows={[
        ['Depth over the plates', millimetres(stack.depth)],
        ['Sweep radius', millimetres(stack.sweepRadius)],
        ['Outer radius', millimetres(stack.outerRadius)],
        ['Rotor spacer length', millimetres(result.rotorSpacer)],
        ['Stator spacer length', millimetres(result.statorSpacer)],
        ['Gaps, one blade and stator', result.gaps],
        ['Mass of all plates', mass(stack.mass)],
        ['Cut length, all plates', `${(stack.cutLength / 1000).toPrecision(3)} m`],
        ['Stator form', result.statorForm === 'even' ? 'even radius' : 'follows the rotor'],
        ['Plates alone, open stop', picofarads(result.platesOpen)],
        ['Plates alone, law begins', picofarads(result.platesAtLaw)],
        ['Insulators and frame, allowed', picofarads(result.frame)],
        ['Trimmer has to add', picofarads(result.trimmer)],
        ['Section itself, law begins', picofarads(result.ownMin)],
        ['Section itself, law ends', picofarads(result.ownMax)],
      ]}
    />
  );
}
