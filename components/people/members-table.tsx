import { Button } from '@/components/ui/button';
import { LocalTime } from '@/components/ui/local-time';
import type { Member } from '@/lib/schemas/people';

const cell = 'px-3 py-2 whitespace-nowrap';

/** The members by name; for an owner with what can be done. */
export function MembersTable({
  members,
  me,
  onRole,
  onRemove,
}: {
  members: readonly Member[];
  me: string;
  onRole?: (member: Member) => void;
  onRemove?: (member: Member) => void;
}) {
  return (
    <div role="region" aria-label="Members, table" tabIndex={0} className="overflow-x-auto">
      <table aria-label="Members" className="dense w-full border-y border-line bg-panel">
        <thead>
          <tr className="border-b border-line bg-page text-left">
            {['Name', 'Email', 'Role', 'Member since'].map((label) => (
              <th key={label} scope="col" className="px-3 py-2 font-medium">
                {label}
              </th>
            ))}
            {onRole && (
              <th scope="col">
                <span className="sr-only">Change it</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {members.map((member) => (
            <tr key={member.id} className="border-b border-line last:border-0">
              <th scope="row" className={`${cell} text-left font-medium`}>
                {member.name}
                {member.id === me && <span className="font-normal text-ink-2"> (you)</span>}
              </th>
              <td className={cell}>{member.email}</td>
              <td className={cell}>{member.role}</td>
              <td className={cell}>
                <LocalTime iso={member.since} />
              </td>
              {onRole && onRemove && (
                <td className="px-3 py-1 text-right whitespace-nowrap">
                  <Button
                    look="quiet"
                    aria-label={`Change the role of ${member.name}`}
                    onPress={() => onRole(member)}
                  >
                    Change role
                  </Button>
                  <Button
                    look="quiet"
                    aria-label={`Remove ${member.name}`}
                    onPress={() => onRemove(member)}
                  >
                    Remove
                  </Button>
                </td>
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
