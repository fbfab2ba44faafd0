import { formatQuantity, type Derived, type Quantity, type SectionResult } from '@/geometry';

/** One figure of what the kernel made of a design, in its unit. */
interface Figure {
  readonly label: string;
  readonly value: number;
  /** Written with this many digits. */
  readonly write: (value: number) => string;
}

const DIGITS = 6;

const plain = (unit: string, factor = 1) => {
  return (value: number) =>
    `${Number((value * factor).toPrecision(DIGITS))}${unit === '' ? '' : ` ${unit}`}`;
};
const as = (quantity: Quantity) => (value: number) => formatQuantity(value, quantity, DIGITS);

function sectionFigures(section: SectionResult, where: string): Figure[] {
  const { law, rotor, stator } = section;
  const rows: [string, number | null, Figure['write']][] = [
    ['Total where the law begins', section.totalMin, as('capacitance')],
    ['Total where the law ends', section.totalMax, as('capacitance')],
    ['Coil', section.inductance, as('inductance')],
    ['Largest law error, 5 to 95 % of the law', law.largestInner.fraction, plain('%', 100)],
    ['Largest law error, whole law', law.largestError.fraction, plain('%', 100)],
    ['Plates alone, open stop', section.platesOpen, as('capacitance')],
    ['Plates alone, law begins', section.platesAtLaw, as('capacitance')],
    ['Trimmer has to add', section.trimmer, as('capacitance')],
    ['Air gap', section.airGap, as('length')],
    ['Gaps, one blade and stator', section.gaps, as('count')],
    ['Rotor plates', rotor.quantity, as('count')],
    ['Stator plates', stator.quantity, as('count')],
    ['Rotor plate, area', rotor.area, plain('mm²')],
    ['Stator plate, area', stator.area, plain('mm²')],
    ['Sweep radius', section.sweepRadius, as('length')],
    ['Narrowest blade over the hub', section.narrowestBlade, as('length')],
    ['Rotor spacer length', section.rotorSpacer, as('length')],
    ['Stator spacer length', section.statorSpacer, as('length')],
  ];
  return rows.flatMap(([label, value, write]) =>
    value === null ? [] : [{ label: label + where, value, write }],
  );
}

/** What was achieved, and what is cut for it. */
function figuresOf({ sections, stack, findings }: Derived): Figure[] {
  const counted = (severity: string) =>
    findings.filter((finding) => finding.severity === severity).length;
  return [
    ...sections.flatMap((section, index) =>
      sectionFigures(section, sections.length > 1 ? `, section ${index + 1}` : ''),
    ),
    { label: 'Depth over the plates', value: stack.depth, write: as('length') },
    { label: 'Outer radius', value: stack.outerRadius, write: as('length') },
    { label: 'Mass of all plates', value: stack.mass, write: plain('g') },
    { label: 'Cut length, all plates', value: stack.cutLength, write: plain('m', 1e-3) },
    { label: 'Checks that fail', value: counted('fail'), write: as('count') },
    { label: 'Checks to look at', value: counted('warn'), write: as('count') },
  ];
}

/** One figure of two states; null where one of them has none of it. */
interface FigurePair {
  readonly label: string;
  readonly a: string | null;
  readonly b: string | null;
  /** Second less first; null where they are the same or one is missing. */
  readonly change: string | null;
  readonly same: boolean;
}

/** Below this share two figures are the same: the last digits of the arithmetic, or of JSON. */
const SAME = 1e-9;

function changeOf(a: Figure, b: Figure): string | null {
  const difference = b.value - a.value;
  if (Math.abs(difference) <= SAME * Math.max(Math.abs(a.value), Math.abs(b.value)))
    return null;
  const sign = difference > 0 ? '+' : '−';
  const share =
    a.value === 0
      ? ''
      : ` (${sign}${Number(Math.abs((100 * difference) / a.value).toPrecision(3))} %)`;
  return `${sign}${a.write(Number(Math.abs(difference).toPrecision(3)))}${share}`;
}

/** The figures of two states beside each other, in the order of the first. */
export function figurePairs(a: Derived, b: Derived): FigurePair[] {
  const [first, second] = [figuresOf(a), figuresOf(b)];
  const labels = [...new Set([...first, ...second].map(({ label }) => label))];
  return labels.map((label) => {
    const [one, two] = [first, second].map((figures) =>
      figures.find((figure) => figure.label === label),
    );
    const change = one && two ? changeOf(one, two) : null;
    return {
      label,
      a: one ? one.write(one.value) : null,
      b: two ? two.write(two.value) : null,
      change,
      same: one !== undefined && two !== undefined && change === null,
    };
  });
}
