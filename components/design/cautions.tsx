/** What can hurt somebody, in plain sight of whoever designs or cuts. */
export function Cautions() {
  return (
    <div className="flex flex-col gap-1.5 border-l-4 border-warn bg-warn-tint px-3 py-2 text-small">
      <p>
        <strong>High voltage and RF can injure or kill.</strong> A capacitor can hold its
        charge, and RF burns without a shock. The voltage figures are common practice for clean,
        dry air and rounded edges, not a rating.
      </p>
      <p>
        Local codes, the cutting machine&rsquo;s manual and licensed practice come before
        anything on this screen.
      </p>
    </div>
  );
}
