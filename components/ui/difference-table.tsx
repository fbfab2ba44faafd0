/** Two people's values side by side, those that differ. */
export function DifferenceTable({
  rows,
  theirName,
}: {
  rows: readonly { readonly label: string; readonly mine: string; readonly theirs: string }[];
  theirName: string;
}) {
  return (
    <table className="dense w-full text-left">
      <thead>
        <tr className="border-b border-line text-small text-ink-2">
          <th scope="col" className="py-1 pr-3 font-semibold">
            Differs in
          </th>
          <th scope="col" className="py-1 pr-3 font-semibold">
            Yours
          </th>
          <th scope="col" className="py-1 font-semibold">
            {theirName}
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.label} className="border-b border-line">
            <th scope="row" className="py-1 pr-3 font-normal">
              {row.label}
            </th>
            <td className="py-1 pr-3">{row.mine}</td>
            <td className="py-1">{row.theirs}</td>
          </tr>
        ))}
        {rows.length === 0 && (
          <tr>
            <td colSpan={3} className="py-2">
              Nothing: both hold the same values.
            </td>
          </tr>
        )}
      </tbody>
    </table>
  );
}
