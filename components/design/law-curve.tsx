/** Capacitance over the travel for each law, from a tenth of full to full, drawn from its formula. */
const laws: Record<string, (part: number) => number> = {
  capacitance: (part) => 0.1 + 0.9 * part,
  wavelength: (part) => (Math.sqrt(0.1) + (1 - Math.sqrt(0.1)) * part) ** 2,
  frequency: (part) => (0.1 ** -0.5 + (1 - 0.1 ** -0.5) * part) ** -2,
  logarithmic: (part) => 0.1 * 10 ** part,
  // An oscillator 0.27 of the highest signal above a circuit of equal steps of frequency.
  tracked: (part) => ((0.1 ** 0.5 + 0.27) / (1 + (0.1 ** 0.5 - 1) * part + 0.27)) ** 2,
};

export function LawCurve({ law }: { law: string }) {
  const curve = laws[law];
  if (!curve) return null;
  const points = Array.from({ length: 17 }, (_, i) => {
    const part = i / 16;
    return `${(2 + 30 * part).toFixed(1)},${(17 - 15 * curve(part)).toFixed(1)}`;
  });
  return (
    <svg width="34" height="18" viewBox="0 0 34 18" aria-hidden="true">
      <polyline
        points={points.join(' ')}
        fill="none"
        stroke="currentColor"
        strokeWidth="1.6"
        strokeLinecap="round"
      />
    </svg>
  );
}
