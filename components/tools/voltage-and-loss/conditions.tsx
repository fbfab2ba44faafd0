import { formatQuantity, type Design, type Section } from '@/geometry';
import { sectionParameters, sharedParameters } from '@/geometry/parameters';
import type { ToolProps } from '../tool-props';
import { AppliedField } from './applied-field';

/** Altitude and working frequency of the design, changed from here. */
export function Conditions({
  design,
  section,
  apply,
}: Pick<ToolProps, 'design' | 'section' | 'apply'>) {
  const values: Section = design.sections[section]!;
  const { altitude } = sharedParameters;
  const { workingFrequency } = sectionParameters;
  return (
    <div className="flex flex-col gap-3">
      <AppliedField
        label={altitude.label}
        description="Above sea level."
        quantity="altitude"
        value={design.altitude}
        min={altitude.min}
        max={altitude.max}
        onApply={(value) =>
          apply(
            (before): Design => ({ ...before, altitude: value ?? altitude.default }),
            `Altitude of use set to ${formatQuantity(value ?? altitude.default, 'altitude')}`,
          )
        }
      />
      <AppliedField
        label={workingFrequency.label}
        description="Left empty: over the band, if the design has one."
        quantity="frequency"
        value={values.workingFrequency}
        min={workingFrequency.min}
        max={workingFrequency.max}
        optional
        onApply={(value) =>
          apply(
            (before): Design => ({
              ...before,
              sections: before.sections.map((own, i) =>
                i === section ? { ...own, workingFrequency: value } : own,
              ),
            }),
            value === null
              ? 'Working frequency left open'
              : `Working frequency set to ${formatQuantity(value, 'frequency')}`,
          )
        }
      />
    </div>
  );
}
