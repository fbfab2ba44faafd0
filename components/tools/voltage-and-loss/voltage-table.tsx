import { formatQuantity, type Design, type Section } from '@/geometry';
import {
  paschenVoltage,
  practiceVoltage,
  RADIO_FREQUENCY_SHARE,
} from '@/geometry/electrical/breakdown';
import { clearanceVoltage } from '@/geometry/electrical/clearance';
import { airPath } from '@/geometry/electrical/gap';

const volts = (value: number | null): string =>
  value === null ? 'outside the table' : formatQuantity(value, 'voltage', 3);

/** What the air of a gap holds by each reckoning, side by side; peak voltage between terminals. */
export function VoltageTable({ design, section }: { design: Design; section: Section }) {
  const { length, share } = airPath(design, section);
  if (length === 0) {
    return (
      <p>
        A solid disc fills the gap: what it holds is for its maker to say, and the way over its
        edge for a test.
      </p>
    );
  }
  const { altitude } = design;
  const paschen = paschenVoltage(length, altitude);
  const rows: [string, number | null, string][] = [
    ['Smooth, parallel, clean plates', paschen, 'breaks down: Paschen’s law'],
    [
      'The same at radio frequency',
      paschen * RADIO_FREQUENCY_SHARE,
      'four fifths: common practice, no source',
    ],
    [
      'Clearance, square cut edges',
      clearanceVoltage(length, 'inhomogeneous', altitude),
      'IEC 60664-1, inhomogeneous field',
    ],
    [
      'Clearance, even field',
      clearanceVoltage(length, 'homogeneous', altitude),
      'IEC 60664-1, homogeneous field',
    ],
    [
      '1 kV peak for each millimetre',
      practiceVoltage(length, altitude),
      'common practice, rounded edges; less in thin air, as by Paschen',
    ],
  ];
  return (
    <>
      <table className="dense w-full text-small">
        <thead>
          <tr className="border-b border-edge text-left">
            <th scope="col" className="py-1.5 font-medium">
              Reckoned by
            </th>
            <th scope="col" className="py-1.5 text-right font-medium">
              Peak between terminals
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map(([label, voltage, source]) => (
            <tr key={label} className="border-b border-line">
              <th scope="row" className="py-1.5 pr-3 text-left font-normal">
                {label}
                <span className="block text-ink-2">{source}</span>
              </th>
              <td className="py-1.5 text-right whitespace-nowrap tabular-nums">
                {volts(voltage === null ? null : voltage / share)}
              </td>
            </tr>
          ))}
          <tr className="font-semibold">
            <th scope="row" className="py-1.5 pr-3 text-left">
              Working voltage of the design
            </th>
            <td className="py-1.5 text-right whitespace-nowrap tabular-nums">
              {volts(section.workingVoltage)}
            </td>
          </tr>
        </tbody>
      </table>
      <p className="text-small text-ink-2">
        {formatQuantity(length, 'length', 3)} of air
        {share !== 1 &&
          `, which takes ${Number((100 * share).toPrecision(3))} % of the voltage`}
        , at {formatQuantity(altitude, 'altitude', 4)} above sea level. None of these is a
        rating: dust, burrs, damp and sharp corners hold less. The clearance table is cited
        second-hand: confirm it before you quote it. Between its rows a straight line is taken,
        and it is meant for up to 30 kHz. The least of common practice, square cut edges and
        breakdown is what the checks go by.
      </p>
    </>
  );
}
