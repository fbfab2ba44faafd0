import { SeverityShape } from '@/components/ui/severity';
import type { Revision } from '@/lib/schemas/revision';

/** Checks that failed and were released all the same, with who said why. */
export function WaiverList({ waivers }: { waivers: Revision['waivers'] }) {
  if (waivers.length === 0) return null;
  return (
    <ul aria-label="Released in spite of" className="flex flex-col gap-1">
      {waivers.map(({ code, section, label, reason, by }) => (
        <li key={`${code} ${section} ${label}`} className="flex items-start gap-2">
          <span className="pt-0.5">
            <SeverityShape severity="fail" />
          </span>
          <span className="wrap-anywhere">
            {label}
            {section !== null && `, section ${section + 1}`}: released all the same by {by}, “
            {reason}”
          </span>
        </li>
      ))}
    </ul>
  );
}
