'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { mailsKey, peopleKey, withdrawInvitation } from '@/components/api/people';
import { Button } from '@/components/ui/button';
import { LocalTime } from '@/components/ui/local-time';
import { Notice } from '@/components/ui/notice';
import type { Invitation } from '@/lib/schemas/people';

const cell = 'px-3 py-2 whitespace-nowrap';

/** Invitations that nobody has used yet. */
export function InvitationsTable({ invitations }: { invitations: readonly Invitation[] }) {
  const client = useQueryClient();
  const withdrawal = useMutation({
    mutationFn: withdrawInvitation,
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: peopleKey }),
        client.invalidateQueries({ queryKey: mailsKey }),
      ]),
  });
  return (
    <section aria-labelledby="invited" className="flex flex-col gap-3">
      <h2 id="invited" className="wide-letter text-lead font-semibold">
        Invited
      </h2>
      {withdrawal.isError && <Notice look="bad">{withdrawal.error.message}</Notice>}
      {invitations.length === 0 ? (
        <p className="text-ink-2">Nobody is asked in at present.</p>
      ) : (
        <div role="region" aria-label="Invited, table" tabIndex={0} className="overflow-x-auto">
          <table aria-label="Invited" className="dense w-full border-y border-line bg-panel">
            <thead>
              <tr className="border-b border-line bg-page text-left">
                {['Email', 'As', 'By', 'Until'].map((label) => (
                  <th key={label} scope="col" className="px-3 py-2 font-medium">
                    {label}
                  </th>
                ))}
                <th scope="col">
                  <span className="sr-only">Change it</span>
                </th>
              </tr>
            </thead>
            <tbody>
              {invitations.map(({ id, email, role, invitedBy, expiresAt, expired }) => (
                <tr key={id} className="border-b border-line last:border-0">
                  <th scope="row" className={`${cell} text-left font-medium`}>
                    {email}
                  </th>
                  <td className={cell}>{role}</td>
                  <td className={cell}>{invitedBy}</td>
                  <td className={cell}>
                    {expired && <span className="font-semibold text-warn">expired </span>}
                    <LocalTime iso={expiresAt} />
                  </td>
                  <td className="px-3 py-1 text-right">
                    <Button
                      look="quiet"
                      aria-label={`Withdraw the invitation of ${email}`}
                      isDisabled={withdrawal.isPending}
                      onPress={() => withdrawal.mutate(id)}
                    >
                      Withdraw
                    </Button>
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </section>
  );
}
