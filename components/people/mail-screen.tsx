'use client';

import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { fetchMails, mailsKey } from '@/components/api/people';
import { Button } from '@/components/ui/button';
import { LocalTime } from '@/components/ui/local-time';
import { Notice } from '@/components/ui/notice';
import type { SentMail, SentMails } from '@/lib/schemas/mail';
import { MailWords } from './mail-words';

/** How often the list is asked for while a mail waits, ms: sending is nobody's event. */
const WHILE_WAITING = 2_000;

const cell = 'px-3 py-2 align-top';

function state({ sentAt, attempts, lastError }: SentMail): string {
  if (sentAt) return 'sent';
  if (attempts === 0) return 'waiting';
  return `waiting, tried ${attempts === 1 ? 'once' : `${attempts} times`}: ${lastError ?? 'no answer'}`;
}

/** What mail the workshop sent to whom, and what became of it. */
export function MailScreen({ initial }: { initial: SentMails }) {
  const [shown, show] = useState<string | null>(null);
  const { data } = useQuery({
    queryKey: mailsKey,
    queryFn: fetchMails,
    initialData: initial,
    refetchInterval: ({ state: { data: now } }) =>
      now?.mails.some(({ sentAt }) => sentAt === null) ? WHILE_WAITING : false,
  });
  return (
    <main id="main" className="mx-auto flex w-full max-w-6xl flex-col gap-5 px-5 py-5">
      <h1 className="wide-letter text-title font-semibold">Mail sent</h1>
      {data.standIn && (
        <Notice>
          No mail server is set up here: mail goes to a stand-in on this machine and can be read
          below, with new passwords of members. Open the link of somebody else in a private
          window, where you are not signed in.
        </Notice>
      )}
      {data.mails.length === 0 ? (
        <p className="text-ink-2">No mail yet. Invite somebody, and it stands here.</p>
      ) : (
        <div role="region" aria-label="Mail, table" tabIndex={0} className="overflow-x-auto">
          <table aria-label="Mail" className="dense w-full border-y border-line bg-panel">
            <thead>
              <tr className="border-b border-line bg-page text-left">
                {['Subject', 'To', 'Written', 'State'].map((label) => (
                  <th key={label} scope="col" className="px-3 py-2 font-medium">
                    {label}
                  </th>
                ))}
                {data.standIn && (
                  <th scope="col">
                    <span className="sr-only">Words</span>
                  </th>
                )}
              </tr>
            </thead>
            <tbody>
              {data.mails.map((mail) => (
                <tr key={mail.id} className="border-b border-line last:border-0">
                  <th scope="row" className={`${cell} min-w-60 text-left font-medium`}>
                    {mail.subject}
                  </th>
                  <td className={`${cell} whitespace-nowrap`}>{mail.to}</td>
                  <td className={cell}>
                    <LocalTime iso={mail.at} />
                  </td>
                  <td className={`${cell} ${mail.sentAt ? '' : 'text-warn'}`}>{state(mail)}</td>
                  {data.standIn && (
                    <td className="px-3 py-1 text-right whitespace-nowrap">
                      {mail.words && (
                        <Button
                          look="quiet"
                          aria-label={`Read the mail to ${mail.to}: ${mail.subject}`}
                          onPress={() => show(mail.id)}
                        >
                          Read
                        </Button>
                      )}
                    </td>
                  )}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
      <MailWords
        mail={data.mails.find(({ id }) => id === shown) ?? null}
        onClose={() => show(null)}
      />
    </main>
  );
}
