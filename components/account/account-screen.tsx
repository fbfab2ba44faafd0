import { Notice } from '@/components/ui/notice';
import type { OwnWorkshop } from '@/lib/schemas/account';
import { EndSessions } from './end-sessions';
import { MailChoices } from './mail-choices';
import { NameForm } from './name-form';
import { OpenWorkshopForm } from './open-workshop-form';
import { PasswordForm } from './password-form';
import { WorkshopRow } from './workshop-row';

const section = 'flex flex-col gap-3 border-t border-line pt-5';
const heading = 'wide-letter text-lead font-semibold';

/** All that one person may set for themselves. */
export function AccountScreen({
  name,
  email,
  workshops,
  here,
}: {
  name: string;
  email: string;
  workshops: readonly OwnWorkshop[];
  /** Id of the workshop they are in. */
  here: string | null;
}) {
  return (
    <main id="main" className="mx-auto flex w-full max-w-2xl flex-col gap-6 px-5 py-5">
      <h1 className="wide-letter text-title font-semibold">Your account</h1>
      {workshops.length === 0 && (
        <Notice look="warn">
          You belong to no workshop now. Open the link of an invitation that came to {email}, or
          set up a workshop of your own below.
        </Notice>
      )}
      <section aria-labelledby="own-workshops" className={section}>
        <h2 id="own-workshops" className={heading}>
          Your workshops
        </h2>
        {workshops.length > 0 && (
          <ul className="flex flex-col gap-4">
            {workshops.map((workshop) => (
              <li key={workshop.id} className="flex flex-col gap-2">
                <WorkshopRow workshop={workshop} isHere={workshop.id === here} />
                <MailChoices workshop={workshop} />
              </li>
            ))}
          </ul>
        )}
        <OpenWorkshopForm />
      </section>
      <section aria-labelledby="own-name" className={section}>
        <h2 id="own-name" className={heading}>
          Name
        </h2>
        <NameForm name={name} email={email} />
      </section>
      <section aria-labelledby="own-password" className={section}>
        <h2 id="own-password" className={heading}>
          Password
        </h2>
        <PasswordForm email={email} />
      </section>
      <section aria-labelledby="own-sessions" className={section}>
        <h2 id="own-sessions" className={heading}>
          Where you are signed in
        </h2>
        <EndSessions />
      </section>
    </main>
  );
}
