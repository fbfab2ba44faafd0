import { formatQuantity, resonantFrequency, type Derived } from '@/geometry';
import { lossLeftOut, sectionLoss, surfaceMetal } from '@/geometry/electrical/loss';

const ohms = (value: number): string =>
  value < 1
    ? `${Number((1000 * value).toPrecision(3))} mΩ`
    : `${Number(value.toPrecision(3))} Ω`;

const microns = (value: number): string => `${Number((1000 * value).toPrecision(3))} µm`;

/** Fractions of the law at which the table has a row. */
const ROWS = [0, 0.25, 0.5, 0.75, 1];

/** Loss and Q over the band, or at the working frequency. */
export function LossTable({ derived, section }: { derived: Derived; section: number }) {
  const { design, sections } = derived;
  const result = sections[section]!;
  const { workingFrequency } = design.sections[section]!;
  const { law, inductance, stray } = result;
  if (workingFrequency === null && inductance === null) {
    return (
      <p>
        Give a working frequency among the plates of the section, or the band with its coil, and
        loss and Q are reckoned here.
      </p>
    );
  }
  const rows = ROWS.map((fraction) => {
    const angle = law.from + fraction * (law.to - law.from);
    const i = law.angle.findIndex((a) => a >= angle - 1e-9);
    const total = law.achieved[i]!;
    const frequency = workingFrequency ?? resonantFrequency(total, inductance!);
    const capacitance = total - stray;
    return {
      capacitance,
      frequency,
      loss: sectionLoss(derived, section, frequency, capacitance),
    };
  });
  return (
    <>
      <div role="region" aria-label="Loss and Q" tabIndex={0} className="overflow-x-auto">
        <table className="dense w-full text-right text-small tabular-nums">
          <thead>
            <tr className="border-b border-edge">
              {['At', 'Section has', 'Skin depth', 'Plates', 'Shaft, posts', 'Q'].map(
                (title) => (
                  <th key={title} scope="col" className="py-1.5 pl-3 font-medium first:pl-0">
                    {title}
                  </th>
                ),
              )}
            </tr>
          </thead>
          <tbody>
            {rows.map(({ capacitance, frequency, loss }) => (
              <tr key={capacitance} className="border-b border-line">
                <th scope="row" className="py-1.5 font-normal whitespace-nowrap">
                  {formatQuantity(frequency, 'frequency', 4)}
                </th>
                <td className="whitespace-nowrap">
                  {formatQuantity(capacitance, 'capacitance', 4)}
                </td>
                <td className="whitespace-nowrap">{microns(loss.skinDepth)}</td>
                <td className="whitespace-nowrap">{ohms(loss.plates)}</td>
                <td className="whitespace-nowrap">{ohms(loss.rods)}</td>
                <td>{Math.round(Number(loss.q.toPrecision(2)))}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="text-small text-ink-2">
        With meshed plates of {surfaceMetal(design)}
        {design.finish === 'silver' &&
          `, if the silver is some times ${microns(rows[0]!.loss.skinDepth)} thick`}
        . The true Q is lower. Left out: {lossLeftOut.join('; ')}.
      </p>
    </>
  );
}
